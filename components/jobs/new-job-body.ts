import type { StartJobInput } from '@/lib/contracts/jobs';
import type { LatLon } from '@/lib/travel/place';

type Fields = Record<string, string>;

/** What the form's texts mean. Numbers that are none go as they are, and come back with the words for it. */
export function newJobBody(fields: Fields, place: LatLon | null): StartJobInput {
  const { name = '', phone = '', email = '', street = '', town = '', postcode = '' } = fields;
  return {
    customer: {
      name,
      phone,
      email,
      language: fields.language === 'es' ? 'es' : 'en',
      mayText: fields.mayText === 'yes',
      mayEmail: fields.mayEmail === 'yes',
    },
    site: {
      street,
      town,
      postcode,
      latitude: place?.lat ?? null,
      longitude: place?.lon ?? null,
      wayIn: fields.wayIn ?? '',
      floorsUp: Number(fields.floorsUp || 0),
      hasLift: fields.hasLift === 'yes',
      yearBuilt: fields.yearBuilt ? Number(fields.yearBuilt) : null,
    },
    title: fields.title ?? '',
    roomCount: Number(fields.roomCount || 1),
    unitCount: Number(fields.unitCount || 0),
    wallsReady: wallsReady(fields.wallsReady),
    siteReadyOn: fields.siteReadyOn || null,
    notes: fields.notes ?? '',
  };
}

function wallsReady(text: string | undefined): StartJobInput['wallsReady'] {
  return text === 'closed' || text === 'bare-studs' ? text : 'not-yet';
}
