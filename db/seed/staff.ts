/** The demo's people: all invented. The first five sign in. */
import type { Role } from '@/lib/permissions';

export const juniperBend = {
  name: 'Juniper Bend Cabinet Works',
  phone: '+12125550142',
  email: 'office@juniperbend.example',
  zone: 'America/New_York',
};

export type StaffKey = keyof typeof staff;

export const staff = {
  owner: { name: 'June Bend', role: 'owner', email: 'owner@juniperbend.example' },
  scheduler: { name: 'Petra Lowe', role: 'scheduler', email: 'scheduler@juniperbend.example' },
  measurer: { name: 'Ines Marl', role: 'measurer', email: 'measurer@juniperbend.example' },
  bench: { name: 'Hob Carver', role: 'bench', email: 'bench@juniperbend.example' },
  crew: { name: 'Dara Finch', role: 'crew', email: 'crew@juniperbend.example' },
  tor: { name: 'Tor Ashby', role: 'measurer', email: 'tor@juniperbend.example' },
  wim: { name: 'Wim Sorrel', role: 'crew', email: null },
  bo: { name: 'Bo Thatcher', role: 'crew', email: 'bo@juniperbend.example' },
  lil: { name: 'Lil Quarry', role: 'crew', email: null },
} satisfies Record<string, { name: string; role: Role; email: string | null }>;

export const crewsOfTheShop = [
  { key: 'north', name: 'Crew North', does: 'fit', colour: '1', people: ['crew', 'wim'] },
  { key: 'south', name: 'Crew South', does: 'fit', colour: '2', people: ['bo', 'lil'] },
  { key: 'ines', name: 'Measure: Ines', does: 'measure', colour: '3', people: ['measurer'] },
  { key: 'tor', name: 'Measure: Tor', does: 'measure', colour: '4', people: ['tor'] },
] as const satisfies {
  key: string;
  name: string;
  does: 'measure' | 'fit';
  colour: '1' | '2' | '3' | '4' | '5' | '6';
  people: StaffKey[];
}[];
export type CrewKey = (typeof crewsOfTheShop)[number]['key'];
