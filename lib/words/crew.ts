/** What a crew's phone says, in the language that its holder chose. Spanish is recalled, not sourced: see DEVELOPERS.md. */
import type { CautionKind, SiteCaution } from '@/lib/cautions/site-cautions';
import type { ChecklistItem } from '@/lib/contracts/checklists';
import type { CheckAnswer, PauseReason } from '@/lib/contracts/day-events';
import type { SnagKind, SnagMender } from '@/lib/contracts/snags';
import type { ReportVisitInput, VisitStatus } from '@/lib/contracts/visits';
import type { SettingStep, StartReason } from '@/lib/days/setting-order';
import type { BringItem } from '@/lib/days/what-to-bring';
import type { EdgeScribe } from '@/lib/measure/run-fit';
import type { VisitKind } from '@/lib/schedule/visit-kind';
import { crewEn } from './crew-en';
import { crewEs } from './crew-es';
import { type Region, spanishTradeWord, tradeWord } from './trade';

export type CrewLanguage = 'en' | 'es';
type Count = (count: number) => string;
type One = (text: string) => string;

export type CrewWords = {
  languageName: string;
  today: string;
  stops: Count;
  nothingToday: string;
  nothingTodayMore: string;
  drive: (minutes: number, isEstimated: boolean) => string;
  fromBase: string;
  kinds: Record<VisitKind, string>;
  statuses: Record<VisitStatus, string>;
  taps: Record<ReportVisitInput['what'], string>;
  howLate: string;
  lateMinutes: Count;
  notLate: string;
  pause: string;
  goOn: string;
  pauseWhy: string;
  pauses: Record<PauseReason, string>;
  onSite: (hours: number, minutes: number) => string;
  paused: string;
  theWay: string;
  directions: string;
  ring: string;
  wayIn: string;
  parking: string;
  accessCode: string;
  showCode: string;
  hideCode: string;
  codeOnDay: string;
  codeNotHere: string;
  customerSays: string;
  notes: string;
  work: string;
  bring: string;
  setting: string;
  revision: One;
  noSheet: string;
  superseded: string;
  asFound: string;
  checklist: string;
  checked: (done: number, all: number) => string;
  snags: string;
  open: Count;
  partShort: string;
  signOff: string;
  signed: string;
  back: string;
  save: string;
  keepFailed: string;
  notKept: string;
  finish: string;
  bringItems: {
    filler: (count: number, length: string, widest: string) => string;
    kick: (length: string, tallest: string) => string;
    crown: One;
    legs: (count: number, least: string, most: string) => string;
    shims: One;
    backing: One;
  } & Record<
    Exclude<BringItem['what'], 'filler' | 'kick' | 'crown' | 'legs' | 'shims' | 'backing'>,
    string
  >;
  highPoint: (wall: string, along: string) => string;
  datum: (name: string, height: string) => string;
  wall: One;
  order: string;
  orderNote: string;
  steps: Record<SettingStep['step'], string>;
  startAt: (unit: string, why: string) => string;
  startWhy: Record<StartReason, string>;
  fillersToCut: string;
  filler: (side: string, top: string, bottom: string) => string;
  blank: One;
  sides: Record<'left' | 'right', string>;
  kickHeights: string;
  kickRange: (least: string, most: string) => string;
  mitres: string;
  mitre: (corner: string, angle: string, saw: string) => string;
  leftLong: string;
  /** Which edge: the engine says it in English. */
  edge: (scribe: Pick<EdgeScribe, 'edge' | 'words'>) => string;
  studsHere: string;
  studsAt: (wall: string, list: string) => string;
  predicted: string;
  drawnAs: string;
  cautions: string;
  sourceIs: One;
  cautionWords: Record<CautionKind, (caution: SiteCaution) => string>;
  asFoundLead: string;
  diagonalAsk: (corner: string, legs: string) => string;
  angleAsk: One;
  dropAsk: (at: 'high' | 'low', wall: string, along: string) => string;
  was: One;
  compare: string;
  agrees: string;
  differs: string;
  changes: string;
  ringBeforeCutting: string;
  typeOne: string;
  notRead: One;
  when: Record<ChecklistItem['when'], string>;
  answers: Record<CheckAnswer, string>;
  whyNo: string;
  newSnag: string;
  noSnags: string;
  noSnagsMore: string;
  snagKinds: Record<SnagKind, string>;
  what: string;
  where: string;
  noRoom: string;
  place: string;
  words: string;
  sayWhat: string;
  unit: string;
  mender: string;
  menders: Record<SnagMender, string>;
  due: string;
  photos: string;
  photosOf: Count;
  takePhoto: Record<'take' | 'choose' | 'keeping' | 'cannotOpen' | 'cannotKeep', string>;
  rooms: string;
  measureRoom: One;
  firstRoom: string;
  addRoom: string;
  closeIt: string;
  closeHow: string;
  closeNeeds: string;
  closed: string;
  afterSignOff: string;
  benchSays: One;
  dueOn: One;
  signTitle: string;
  signStatement: One;
  signDelivery: One;
  openHere: Count;
  signerName: string;
  signHere: string;
  clear: string;
  signNow: string;
  signFirst: string;
  nameFirst: string;
  signedBy: (name: string, when: string) => string;
  signedSafe: string;
  copy: string;
  nextStop: string;
  toMend: string;
  toMendOf: (count: number, late: number) => string;
  late: string;
  nothingToMend: string;
  nothingToMendMore: string;
  thereOn: One;
  noVisitThere: string;
};

export const crewWords: Record<CrewLanguage, CrewWords> = { en: crewEn, es: crewEs };

const fills = { kick: 'kick', drywall: 'board', counter: 'counter' } as const;

/**
 * Fills the names of things as the shop's region calls them; a capital in the braces keeps a capital.
 * Edge: words without braces come back as they are. Example: "{Kick} face" in the UK is "Plinth face".
 */
export function inRegion(
  words: string,
  { region, language }: { region: Region; language: CrewLanguage },
): string {
  return words.replace(/\{(\w)(\w+)\}/g, (braces, first: string, rest: string) => {
    const term = Object.entries(fills).find(([name]) => name === first.toLowerCase() + rest)?.[1];
    if (!term) return braces;
    const word = language === 'es' ? spanishTradeWord(term, region) : tradeWord(term, region);
    return first === first.toLowerCase() ? word : word.charAt(0).toUpperCase() + word.slice(1);
  });
}
