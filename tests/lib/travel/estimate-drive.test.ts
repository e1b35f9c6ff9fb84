import { describe, expect, it } from 'vitest';
import { estimateDriveMinutes, geodesicKm } from '@/lib/travel/estimate-drive';
import { isPlace, placeKey } from '@/lib/travel/place';

describe('a drive that no road service answered for', () => {
  it('lies along the ellipsoid: one degree of the equator is 111.319 km', () => {
    // WGS 84, a = 6 378 137 m (NIMA TR8350.2): a · π / 180.
    expect(geodesicKm({ lat: 0, lon: 0 }, { lat: 0, lon: 1 })).toBeCloseTo(111.3195, 4);
  });

  it('is as long as the published example of the geodesic between two airports', () => {
    // GeographicLib, GeodSolve(1), EXAMPLES: 40.6 -73.8 to 51.6 -0.5 is 5 551 759.400 m.
    expect(geodesicKm({ lat: 40.6, lon: -73.8 }, { lat: 51.6, lon: -0.5 })).toBeCloseTo(
      5551.7594,
      4,
    );
  });

  it('takes 1.3 times the geodesic at the speed of the shop', () => {
    const from = { lat: 0, lon: 0 };
    const to = { lat: 0, lon: 0.5 };
    const km = geodesicKm(from, to);
    expect(estimateDriveMinutes(from, to, 60)).toBeCloseTo(km * 1.3, 9);
    expect(estimateDriveMinutes(from, to)).toBeCloseTo((km * 1.3 * 60) / 45, 9);
  });

  it('takes no time to where one is', () => {
    expect(estimateDriveMinutes({ lat: 41.2, lon: -58.3 }, { lat: 41.2, lon: -58.3 })).toBe(0);
  });
});

describe('a place', () => {
  it('is the same within eleven metres, and has no minus nought', () => {
    expect(placeKey({ lat: 41.28434, lon: -58.31196 })).toBe('41.2843,-58.312');
    expect(placeKey({ lat: -0.00001, lon: 0.00001 })).toBe('0,0');
  });

  it('lies on the globe', () => {
    expect(isPlace({ lat: -90, lon: 180 })).toBe(true);
    expect(isPlace({ lat: 90.1, lon: 0 })).toBe(false);
    expect(isPlace({ lat: Number.NaN, lon: 0 })).toBe(false);
  });
});
