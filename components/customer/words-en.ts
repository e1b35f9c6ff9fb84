import type { MissingThing } from '@/lib/messages/missing-words';
import type { VisitKind } from '@/lib/schedule/visit-kind';

type Clear = Record<VisitKind, string[]>;

const measure = [
  'Clear the {counter}s and what stands along the walls',
  'Somebody at home who can open the door',
  'Have the sheets of your appliances and sink at hand, if they are chosen',
];
const work = [
  'Clear the {counter}s and the way in from the street',
  'Water, gas and power to the kitchen off and disconnected by the licensed trade',
  'Children and pets out of the room: saws and lifting',
  'Room for the van near the door',
];

const listOf = (names: readonly string[]) => new Intl.ListFormat('en').format(names);

export const wordsEn = {
  title: 'Your visit',
  arrive: (window: string, until: string) =>
    `We arrive ${window}${until ? ` and work ${until}` : ''}.`,
  /** "Ines and Bram will come to measure your room at"; without names, who comes is the shop. */
  comes: (names: readonly string[], what: string) =>
    `${names.length > 0 ? listOf(names) : 'We'} will come to ${what} at`,
  what: {
    'site-measure': 'measure your room',
    'check-measure': 'check a measurement',
    delivery: 'deliver your cabinets',
    install: 'set your cabinets',
    'worktop-template': 'take the template for your {counter}',
    return: 'finish what is left',
  } satisfies Record<VisitKind, string>,
  ask: 'Does this time suit you?',
  yes: 'Yes, that works',
  another: 'Ask for another time',
  notReady: 'We are not ready yet',
  notReadyMore: 'Something else is not ready',
  notReadyLegend: 'What is not ready?',
  missing: {
    floor: 'The floor',
    power: 'The power',
    parking: 'Room to park',
    away: 'We are away that day',
  } satisfies Record<MissingThing, string>,
  more: 'Anything else',
  send: 'Tell the shop',
  readyNow: 'It is ready now',
  calendar: 'Add to calendar',
  before: 'Before we come',
  clear: {
    'site-measure': measure,
    'check-measure': measure,
    delivery: [
      'Clear the way in from the street, and a dry room where the cabinets can stand',
      'Room for the van near the door',
      'Children and pets out of the way: heavy pieces are carried',
    ],
    install: work,
    'worktop-template': [
      'Clear the {baseUnit}s and put nothing on them',
      'Have the sink, the {tap} and the {cooktop} at hand, or their sheets',
      'Somebody at home who can decide on edges and holes',
    ],
    return: work,
  } satisfies Clear,
  oldHouse:
    'Your home may be old enough for lead paint or asbestos. Tell us what you know: the local law comes before anything is cut, sanded or scraped.',
  caution: 'Stay clear of tools and lifted cabinets while we work.',
  thanks: 'Thank you, it is confirmed. See you then.',
  said: (words: string) => `You told us: “${words}”. The shop will get back to you.`,
  onTheWay: 'We are on the way.',
  late: (arrival: string) => `We are running late, sorry. We now arrive ${arrival}.`,
  here: 'We are here.',
  done: 'This visit is done. Thank you.',
  copy: 'Your copy of what was signed',
  calledOff: 'This visit has been called off. The shop will get back to you.',
  missed: 'We were there and found nobody home. The shop will get back to you.',
  ring: 'Reach the shop',
  map: 'on the map',
  // Other times
  timesTitle: 'Another time',
  now: (day: string, window: string) => `Your visit is set for ${day}, ${window}.`,
  choose: 'Choose one, and we keep it for you for 15 minutes.',
  noTimes:
    'There is no other time to choose here just now. Tell us what would suit, and we call you.',
  taken: 'That time has just gone, or was kept for too long. Here is what is free now.',
  kept: 'Kept for you',
  keptUntil: (time: string) => `until ${time}`,
  left: (clock: string) => `${clock} left`,
  keptOver: 'It is not kept any more. Choose again.',
  take: 'Take this time',
  others: 'Or another one',
  noneSuits: 'None of these: call me',
  askCall: 'Ask us to call you',
  callHint: 'When do you want to be called, and what would suit you?',
  callMe: 'Call me',
  keep: 'Keep the time as it is',
  tooLate: 'This visit cannot be moved here any more. Ring the shop.',
};
