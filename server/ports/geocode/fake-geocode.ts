/** An address service on loopback that knows the demo island's streets; it speaks Nominatim's search protocol. */
import { addressPlace, countyName, streets, type Town, towns } from '@/lib/island/demo-island';
import { type JsonAnswer, startFakeJsonServer } from '@/server/ports/fakes/fake-json-server';

export type FakeGeocode = Awaited<ReturnType<typeof startFakeGeocode>>;

/** No street of the island is longer. */
const MOST_HOUSES = 200;

export const startFakeGeocode = (port = 0) => startFakeJsonServer(answer, port);

function answer(url: URL): JsonAnswer {
  const question = url.searchParams.get('q')?.toLowerCase() ?? '';
  if (url.pathname !== '/search') return { status: 404, body: {} };
  if (question === '') {
    return { status: 400, body: { error: { code: 400, message: 'Nothing to search for.' } } };
  }
  const limit = Number(url.searchParams.get('limit') ?? 10);
  return {
    status: 200,
    body: [...streetResults(question), ...townResults(question)].slice(0, limit),
  };
}

function streetResults(question: string) {
  const named = townsIn(question);
  const found = streets.filter(({ name }) => question.includes(name.toLowerCase()));
  const here = found.filter(({ town }) => named.length === 0 || named.includes(town));
  const number = Number(/\b(\d{1,4})\b/.exec(question)?.[1] ?? 0);
  const house = number >= 1 && number <= MOST_HOUSES ? number : null;
  return here.map(({ name, town }) => {
    const { latitude, longitude } = addressPlace(name, house ?? 1);
    return result({
      latitude,
      longitude,
      address: { ...(house ? { house_number: String(house) } : {}), road: name, town },
    });
  });
}

/** A town alone, when no street was understood. */
function townResults(question: string) {
  const isStreet = streets.some(({ name }) => question.includes(name.toLowerCase()));
  if (isStreet) return [];
  return townsIn(question).map((town) => result({ ...towns[town], address: { town } }));
}

function townsIn(question: string): Town[] {
  return (Object.keys(towns) as Town[]).filter((town) => question.includes(town.toLowerCase()));
}

function result(place: { latitude: number; longitude: number; address: Record<string, string> }) {
  const { house_number, road, town = '' } = place.address;
  const street = [house_number, road].filter(Boolean).join(' ');
  return {
    lat: place.latitude.toFixed(7),
    lon: place.longitude.toFixed(7),
    display_name: [street, town, countyName].filter(Boolean).join(', '),
    category: road ? 'place' : 'boundary',
    type: house_number ? 'house' : road ? 'residential' : 'town',
    address: { ...place.address, county: countyName },
  };
}
