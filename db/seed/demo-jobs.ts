/** Some forty invented jobs at every stage, in words; days are working days from the day of seeding. */
import type { SnagKind, SnagMender } from '@/lib/contracts/snags';
import type { Stage } from '@/lib/schedule/stages';
import type { VisitKind } from '@/lib/schedule/visit-kind';
import type { RoomPlan } from './demo-rooms';
import type { CrewKey } from './staff';

export type DemoVisit = {
  kind: VisitKind;
  crew: CrewKey;
  /** Working days from today; negative is past. */
  day: number;
  time: string;
  workMinutes: number;
  /** Open: booked and not answered. */
  isConfirmed: boolean;
  customerSays?: string;
  /** Nobody was home. */
  isMissed?: boolean;
};

export type DemoSnag = {
  kind: SnagKind;
  place: string;
  words: string;
  mender: SnagMender;
  /** Working days from today on which it was found, and mended where it is. */
  foundDay: number;
  closedDay?: number;
};

export type DemoJob = {
  customer: string;
  street: string;
  house: number;
  title: string;
  units: number;
  stage: Stage;
  language?: 'es';
  yearBuilt?: number;
  wallsReady?: 'not-yet' | 'bare-studs' | 'closed';
  floorAgreed?: boolean;
  notReady?: string;
  /** Working days from today on which the bench says ready; only from "ready" on, or as a promise. */
  readyDay?: number;
  room?: RoomPlan;
  visits?: DemoVisit[];
  snags?: DemoSnag[];
};

const measure = (crew: CrewKey, day: number, time: string, isConfirmed = true): DemoVisit => ({
  kind: 'site-measure',
  crew,
  day,
  time,
  workMinutes: 90,
  isConfirmed,
});
const install = (
  crew: CrewKey,
  day: number,
  workMinutes: number,
  isConfirmed = true,
): DemoVisit => ({ kind: 'install', crew, day, time: '07:30', workMinutes, isConfirmed });
const goBack = (crew: CrewKey, day: number, time: string): DemoVisit => ({
  kind: 'return',
  crew,
  day,
  time,
  workMinutes: 120,
  isConfirmed: true,
});

export const demoJobs: DemoJob[] = [
  // First calls.
  {
    customer: 'Marit Aldous',
    street: 'Quay Rise',
    house: 14,
    title: 'Kitchen, L, 11 units',
    units: 11,
    stage: 'enquiry',
  },
  {
    customer: 'Sef Danner',
    street: 'Sluice House Road',
    house: 2,
    title: 'Utility room, one wall',
    units: 5,
    stage: 'enquiry',
    wallsReady: 'not-yet',
  },
  {
    customer: 'Wren Castell',
    street: 'Tern Street',
    house: 31,
    title: 'Pantry, tall units',
    units: 4,
    stage: 'enquiry',
    wallsReady: 'bare-studs',
  },
  {
    customer: 'Tomas Ruiz',
    street: 'Gannet Way',
    house: 6,
    title: 'Kitchen, galley',
    units: 12,
    stage: 'enquiry',
    language: 'es',
  },
  {
    customer: 'Odile Pryce',
    street: 'Bell Steps',
    house: 2,
    title: 'Kitchen, U, 14 units',
    units: 14,
    stage: 'enquiry',
    yearBuilt: 1931,
  },
  // To measure: waiting, and booked.
  {
    customer: 'Bram Fenn',
    street: 'Salt Row',
    house: 3,
    title: 'Kitchen, one wall, 7 units',
    units: 7,
    stage: 'to-measure',
  },
  {
    customer: 'Isa Okafor',
    street: 'Mill Lane',
    house: 18,
    title: 'Kitchen and bath vanity',
    units: 13,
    stage: 'to-measure',
    visits: [measure('ines', 0, '08:00')],
  },
  {
    customer: 'Joss Voss',
    street: 'Orchard End',
    house: 4,
    title: 'Kitchen, L, 9 units',
    units: 9,
    stage: 'to-measure',
    visits: [measure('ines', 0, '13:00', false)],
  },
  {
    customer: 'Nell Hale',
    street: 'Orchard End',
    house: 11,
    title: 'Kitchen, L, with peninsula',
    units: 12,
    stage: 'to-measure',
    visits: [measure('tor', 0, '10:00')],
  },
  {
    customer: 'Abel Lund',
    street: 'Kiln Yard',
    house: 9,
    title: 'Mud room',
    units: 6,
    stage: 'to-measure',
    visits: [measure('ines', 1, '09:00', false)],
  },
  {
    customer: 'Cleo Brand',
    street: 'Heron Court',
    house: 5,
    title: 'Kitchen, wall run, 6 units',
    units: 6,
    stage: 'to-measure',
    visits: [measure('tor', 1, '08:30')],
  },
  {
    customer: 'Luz Marín',
    street: 'Reedbank',
    house: 7,
    title: 'Cocina en L',
    units: 10,
    stage: 'to-measure',
    language: 'es',
    visits: [measure('ines', 3, '10:00', false)],
  },
  {
    customer: 'Gus Tallow',
    street: 'Ropewalk',
    house: 22,
    title: 'Laundry',
    units: 5,
    stage: 'to-measure',
    visits: [measure('tor', 4, '09:00', false)],
  },
  {
    customer: 'Hetty Crane',
    street: 'Chapel Rise',
    house: 1,
    title: 'Kitchen, new build',
    units: 15,
    stage: 'to-measure',
    wallsReady: 'bare-studs',
  },
  // Measured.
  {
    customer: 'Ruth Ember',
    street: 'Lantern Walk',
    house: 8,
    title: 'Kitchen, out of true',
    units: 12,
    stage: 'measured',
    room: 'badly-out',
    yearBuilt: 1908,
    visits: [measure('ines', -2, '09:00')],
  },
  {
    customer: 'Piet Harrow',
    street: 'Fold Hill',
    house: 16,
    title: 'Kitchen with a chimney corner',
    units: 9,
    stage: 'measured',
    room: 'misread',
    visits: [measure('tor', -1, '10:00')],
  },
  {
    customer: 'Anya Sill',
    street: 'Dyke Road',
    house: 27,
    title: 'Kitchen, one wall',
    units: 8,
    stage: 'measured',
    room: 'plain',
    visits: [measure('ines', -1, '13:00')],
  },
  // Released: the bench has the sheet.
  {
    customer: 'Noor Vale',
    street: 'Quay Rise',
    house: 21,
    title: 'Kitchen, nearly true',
    units: 9,
    stage: 'released',
    room: 'nearly-true',
    visits: [measure('ines', -5, '09:00')],
  },
  {
    customer: 'Ewan Sleight',
    street: 'Heron Court',
    house: 12,
    title: 'Kitchen, one wall',
    units: 8,
    stage: 'released',
    room: 'plain',
    visits: [measure('tor', -6, '09:00')],
  },
  {
    customer: 'Dot Pell',
    street: 'Tern Street',
    house: 9,
    title: 'Scullery',
    units: 6,
    stage: 'released',
    room: 'plain',
    visits: [measure('ines', -7, '13:00')],
  },
  // In build.
  {
    customer: 'Karl Moss',
    street: 'Salt Row',
    house: 15,
    title: 'Kitchen, one wall',
    units: 8,
    stage: 'in-build',
    room: 'plain',
    readyDay: 8,
    floorAgreed: true,
    visits: [measure('tor', -20, '09:00'), install('south', 9, 960, false)],
  },
  {
    customer: 'Ines Tarn',
    street: 'Mill Lane',
    house: 3,
    title: 'Kitchen, one wall',
    units: 7,
    stage: 'in-build',
    room: 'plain',
    readyDay: 6,
    floorAgreed: true,
    visits: [measure('ines', -22, '10:00')],
  },
  {
    customer: 'Otis Brae',
    street: 'Reedbank',
    house: 19,
    title: 'Bar and shelves',
    units: 7,
    stage: 'in-build',
    room: 'plain',
    readyDay: 10,
    visits: [measure('tor', -24, '10:00')],
  },
  {
    customer: 'Vera Knoll',
    street: 'Chapel Rise',
    house: 12,
    title: 'Kitchen, one wall',
    units: 8,
    stage: 'in-build',
    room: 'plain',
    readyDay: 12,
    floorAgreed: true,
    visits: [measure('ines', -18, '09:00')],
  },
  // Ready to be set.
  {
    customer: 'Mo Fairlie',
    street: 'Gannet Way',
    house: 13,
    title: 'Kitchen, one wall',
    units: 8,
    stage: 'ready',
    room: 'plain',
    readyDay: -1,
    floorAgreed: true,
    visits: [measure('tor', -30, '09:00')],
  },
  {
    customer: 'Ada Winnow',
    street: 'Ropewalk',
    house: 4,
    title: 'Kitchen, one wall',
    units: 7,
    stage: 'ready',
    room: 'plain',
    readyDay: -2,
    floorAgreed: true,
    notReady: 'floor is late, to the end of next week',
    visits: [measure('ines', -32, '09:00')],
  },
  {
    customer: 'Bea Sandys',
    street: 'Fold Hill',
    house: 7,
    title: 'Kitchen, one wall',
    units: 8,
    stage: 'ready',
    room: 'plain',
    readyDay: -3,
    floorAgreed: true,
    visits: [measure('tor', -33, '13:00'), install('north', 3, 960)],
  },
  {
    customer: 'Cass Orme',
    street: 'Bell Steps',
    house: 17,
    title: 'Kitchen, third floor, no lift',
    units: 9,
    stage: 'ready',
    room: 'plain',
    readyDay: -2,
    floorAgreed: true,
    visits: [
      measure('ines', -34, '10:00'),
      {
        ...install('south', 3, 1200, false),
        customerSays: 'Mornings are hard, could it be after ten?',
      },
    ],
  },
  {
    customer: 'Roy Tansy',
    street: 'Kiln Yard',
    house: 20,
    title: 'Workshop benches',
    units: 6,
    stage: 'ready',
    room: 'plain',
    readyDay: -4,
    floorAgreed: true,
    visits: [measure('tor', -28, '10:00'), install('south', 7, 480, false)],
  },
  // Being set.
  {
    customer: 'Lena Strand',
    street: 'Lantern Walk',
    house: 23,
    title: 'Kitchen, one wall',
    units: 9,
    stage: 'installing',
    room: 'plain',
    readyDay: -6,
    floorAgreed: true,
    visits: [measure('ines', -40, '09:00'), install('north', -1, 1440)],
  },
  {
    customer: 'Fay Corran',
    street: 'Dyke Road',
    house: 6,
    title: 'Kitchen, one wall',
    units: 7,
    stage: 'installing',
    room: 'plain',
    readyDay: -5,
    floorAgreed: true,
    visits: [measure('tor', -41, '09:00'), install('south', 0, 960)],
  },
  // Snags.
  {
    customer: 'Ivo Merrow',
    street: 'Quay Rise',
    house: 5,
    title: 'Kitchen, one wall',
    units: 8,
    stage: 'snags',
    room: 'plain',
    readyDay: -14,
    floorAgreed: true,
    visits: [measure('ines', -50, '09:00'), install('north', -9, 480), goBack('north', 2, '08:00')],
    snags: [
      {
        kind: 'short',
        place: 'Filler, right end',
        words: 'Filler 4 mm short at the top; the wall leans away. Make a new one.',
        mender: 'bench',
        foundDay: -9,
      },
      {
        kind: 'fault',
        place: 'Drawer base 24',
        words: 'Top drawer rubs on the left.',
        mender: 'crew',
        foundDay: -9,
      },
    ],
  },
  {
    customer: 'Gwen Ashlar',
    street: 'Heron Court',
    house: 2,
    title: 'Utility room',
    units: 6,
    stage: 'snags',
    room: 'plain',
    readyDay: -16,
    floorAgreed: true,
    visits: [measure('tor', -52, '09:00'), install('south', -10, 480)],
    snags: [
      {
        kind: 'damaged',
        place: 'Tall unit, door',
        words: 'Corner of the door bruised in the van.',
        mender: 'bench',
        foundDay: -10,
      },
    ],
  },
  // Signed off.
  {
    customer: 'Per Hollin',
    street: 'Tern Street',
    house: 26,
    title: 'Kitchen, one wall',
    units: 8,
    stage: 'signed-off',
    room: 'plain',
    readyDay: -24,
    floorAgreed: true,
    visits: [
      measure('ines', -60, '09:00'),
      install('north', -18, 480),
      goBack('north', -12, '08:00'),
    ],
    snags: [
      {
        kind: 'wrong-part',
        place: 'Wall unit 30',
        words: 'Hinged left, drawn right.',
        mender: 'bench',
        foundDay: -18,
        closedDay: -12,
      },
    ],
  },
  {
    customer: 'Mae Bright',
    street: 'Mill Lane',
    house: 30,
    title: 'Bath vanities',
    units: 5,
    stage: 'signed-off',
    room: 'plain',
    readyDay: -26,
    floorAgreed: true,
    visits: [measure('tor', -61, '09:00'), install('south', -20, 480)],
  },
  {
    customer: 'Olav Reddy',
    street: 'Orchard End',
    house: 25,
    title: 'Kitchen, one wall',
    units: 8,
    stage: 'signed-off',
    room: 'plain',
    readyDay: -30,
    floorAgreed: true,
    visits: [
      { ...measure('ines', -67, '13:00', false), isMissed: true },
      measure('ines', -66, '09:00'),
      install('south', -24, 540),
    ],
  },
  {
    customer: 'Tess Lamb',
    street: 'Salt Row',
    house: 28,
    title: 'Library shelves',
    units: 9,
    stage: 'signed-off',
    room: 'plain',
    readyDay: -33,
    floorAgreed: true,
    visits: [measure('tor', -68, '09:00'), install('north', -27, 480)],
  },
  // Standing still.
  {
    customer: 'Cyrus Dunn',
    street: 'Chapel Rise',
    house: 8,
    title: 'Kitchen, waits for the roof',
    units: 10,
    stage: 'on-hold',
    wallsReady: 'not-yet',
  },
  {
    customer: 'Vi Sorley',
    street: 'Reedbank',
    house: 3,
    title: 'Kitchen',
    units: 8,
    stage: 'called-off',
  },
];
