import { paths } from '@/lib/paths';
import type { Role } from '@/lib/permissions';

export type ChainStep = {
  title: string;
  /** What to do on the screen that opens. */
  does: string[];
  /** Who is signed in for it; null: the customer, who needs no sign-in. */
  role: Role | null;
  path: string;
  frame: 'desk' | 'phone';
};

/** One job from the first call to the booked install, each step as the person who does it. */
export const chainSteps: ChainStep[] = [
  {
    title: 'The scheduler books the measure',
    does: [
      'Take a “Measure” from the waiting list on the right and drag it into the diary, or press Book.',
      'Choose the measurer and the time. Try a time that is taken: the diary refuses it and says who is there.',
    ],
    role: 'scheduler',
    path: paths.diary(),
    frame: 'desk',
  },
  {
    title: 'The customer says yes',
    does: [
      'The text has arrived. Tap its link, then “Yes, that works”; or text YES back.',
      'Between 9 in the evening and 8 in the morning at the site only the e-mail has: texts wait.',
      'Nobody needs an account, and the page works without scripts.',
    ],
    role: null,
    path: paths.demoPhone(),
    frame: 'phone',
  },
  {
    title: 'The measurer reads the walls',
    does: [
      'Open a visit of today, then a room. One question a screen: type the reading, touch the tape for the fraction.',
      'Close the page in the middle and open it again: everything is kept.',
      '“Before you leave” says what is missing and what disagrees.',
    ],
    role: 'measurer',
    path: paths.today(),
    frame: 'phone',
  },
  {
    title: 'What the walls mean for the cabinets',
    does: [
      'Open a measured job and its room: clear opening, fillers, scribes and kick heights, each with how sure it is.',
      'Press a figure: it shows its readings. Then release the revision to the bench.',
    ],
    role: 'measurer',
    path: paths.jobs(),
    frame: 'desk',
  },
  {
    title: 'The bench takes the sheet up',
    does: ['Open the newest shop sheet, take it up, and say when the cabinets are ready.'],
    role: 'bench',
    path: paths.bench(),
    frame: 'desk',
  },
  {
    title: 'The scheduler books the install',
    does: [
      'The waiting list now offers the install, with from when and why. Book it: it is split over the days it takes.',
    ],
    role: 'scheduler',
    path: paths.diary(),
    frame: 'desk',
  },
];
