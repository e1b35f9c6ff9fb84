import type { Run, RunEnd, Unit } from '@/lib/contracts/runs';
import type { Room } from '@/lib/contracts/wall-book';
import { sortedJson } from '@/lib/sync/sorted-json';
import { fineLength } from './reading-words';
import { wallName } from './room-names';
import { cutRelevant } from './sheet-key';
import { unitWords } from './unit-words';

/**
 * What changed in the runs of a room, in words: runs and units come, gone, widened, moved.
 *
 * Edge: a change that has no word here is told as "laid out anew"; which units may be altered is no change.
 * Example: a sink unit of 36 made 33 in gives `Sink wall: sink 36" is now 33"`.
 */
export function runChanges(
  before: readonly Run[],
  after: readonly Run[],
  { room, unit }: { room: Room; unit: 'in' | 'mm' },
): string[] {
  const changes: string[] = [];
  for (const run of after) {
    const was = before.find(({ id }) => id === run.id);
    if (!was) changes.push(`${run.name}: a new run on ${lower(wallName(room, run.wallId))}`);
    else changes.push(...changesOf(was, run, { room, unit }));
  }
  for (const run of before) {
    if (!after.some(({ id }) => id === run.id)) changes.push(`${run.name}: the run is gone`);
  }
  return changes;
}

function changesOf(
  was: Run,
  now: Run,
  { room, unit }: { room: Room; unit: 'in' | 'mm' },
): string[] {
  const length = (mm: number) => fineLength(mm, unit);
  const changes: string[] = [];
  const tell = (words: string) => changes.push(`${now.name}: ${words}`);
  if (was.name !== now.name) tell(`was called ${was.name}`);
  if (was.wallId !== now.wallId) tell(`now on ${lower(wallName(room, now.wallId))}`);
  for (const [field, words] of lengthFields) {
    if (was[field] !== now[field]) {
      tell(`${words} ${length(was[field])} is now ${length(now[field])}`);
    }
  }
  for (const side of ['left', 'right'] as const) {
    if (!same(was[side], now[side])) tell(`the ${side} end now meets ${endWords(now[side], unit)}`);
  }
  if (!same(was.share, now.share)) tell('the fillers are shared out anew');
  if (was.counterGroup !== now.counterGroup) tell('shares another counter');
  if (was.level !== now.level) tell(`now ${now.level} units`);
  for (const words of unitChanges(was.units, now.units, length)) tell(words);
  if (changes.length === 0 && !same(cutRelevant(was), cutRelevant(now))) tell('laid out anew');
  return changes;
}

const lengthFields = [
  ['carcassDepthMm', 'depth'],
  ['bumperMm', 'bumper'],
  ['doorMm', 'door'],
  ['z0Mm', 'foot'],
  ['z1Mm', 'top'],
] as const;

function unitChanges(
  was: readonly Unit[],
  now: readonly Unit[],
  length: (mm: number) => string,
): string[] {
  const changes: string[] = [];
  const name = (unit: Unit) => unitWords(unit).toLowerCase();
  for (const unit of now) {
    const old = was.find(({ id }) => id === unit.id);
    if (!old) changes.push(`${name(unit)} ${length(unit.widthMm)} is new`);
    else if (old.widthMm !== unit.widthMm) {
      changes.push(`${name(unit)} ${length(old.widthMm)} is now ${length(unit.widthMm)}`);
    } else if (old.kind !== unit.kind) changes.push(`${name(old)} is now ${name(unit)}`);
  }
  for (const unit of was) {
    if (!now.some(({ id }) => id === unit.id)) {
      changes.push(`${name(unit)} ${length(unit.widthMm)} is gone`);
    }
  }
  const order = (list: readonly Unit[], other: readonly Unit[]) =>
    list.map(({ id }) => id).filter((id) => other.some((unit) => unit.id === id));
  if (!same(order(was, now), order(now, was))) changes.push('the units stand in another order');
  return changes;
}

/** What a run meets at an end, in words. */
export function endWords(end: RunEnd, unit: 'in' | 'mm'): string {
  const at = (mm: number) => fineLength(mm, unit);
  switch (end.kind) {
    case 'wall':
      return 'the wall';
    case 'open':
      return `nothing, open to ${at(end.limitMm)}`;
    case 'run':
      return 'another run';
    case 'casing':
      return `a casing at ${at(end.xMm)}`;
    case 'existing':
      return `a cabinet already set at ${at(end.xMm)}`;
  }
}

const same = (one: unknown, other: unknown) => sortedJson(one) === sortedJson(other);
const lower = (words: string) => words.charAt(0).toLowerCase() + words.slice(1);
