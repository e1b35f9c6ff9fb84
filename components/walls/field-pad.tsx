'use client';

import { type ReactNode, useState } from 'react';
import { useTyping } from '@/components/phone/use-typing';
import type { LengthUnit } from '@/lib/units/brands';
import { mayGoOn } from '@/lib/walls-pad/go-on';
import type { PadDraft } from '@/lib/walls-pad/pad-draft';
import {
  emptyEntry,
  isEmptyEntry,
  type PadEntry,
  pressKey,
  pressTick,
} from '@/lib/walls-pad/pad-entry';
import type { PadField } from '@/lib/walls-pad/pad-fields';
import type { SameStart } from '@/lib/walls-pad/same-start';
import { nudged, tapeTicks } from '@/lib/walls-pad/tape-ticks';
import { FractionWords } from './fraction-words';
import { PadKeys } from './pad-keys';
import { type PadSays, PadSaysBox } from './pad-says';
import { PadValue } from './pad-value';
import { TapeStrip } from './tape-strip';
import { useGoOn } from './use-go-on';

export type FieldPadProps = {
  /** Fills what the keys leave. */
  picture: ReactNode;
  title: string;
  detail: string;
  /** "5 of 23 to go". */
  toGo: string;
  fields: readonly PadField[];
  draft: PadDraft;
  onDraft: (draft: PadDraft) => void;
  unit: LengthUnit;
  onUnit: () => void;
  stepMm: number;
  says: PadSays;
  /** Opens the rule behind what is said. */
  onRule?: () => void;
  /** What was kept before this, while nothing is typed yet. */
  lastKept?: string;
  /** What the figure will begin with, offered while nothing is typed. */
  start?: SameStart | null;
  /** Goes on by itself once a tick is touched. */
  goesOn?: boolean;
  /** Beside the chips: another way to take the same thing. */
  otherWay?: { words: string; onPress: () => void };
  /** Tool, what it touches, can't reach it … */
  actions: PadAction[];
  nextWords: string;
  onNext: () => void;
  isBusy: boolean;
  onAgain: (() => void) | null;
};
export type PadAction = { key: string; label: string; value?: string; onPress: () => void };

/** One question: the picture, what is asked, the figure, what it means, and the keys under the thumb. */
export function FieldPad(props: FieldPadProps) {
  const { draft, onDraft, fields, unit, stepMm } = props;
  const [begun] = useState(draft);
  useTyping(draft !== begun);
  const field = fields.find(({ name }) => name === draft.active);
  const entry = draft.entries[draft.active] ?? emptyEntry(unit);
  const withEntry = (next: PadEntry): PadDraft => ({
    ...draft,
    entries: { ...draft.entries, [draft.active]: next },
  });
  const put = (next: PadEntry) => onDraft(withEntry(next));
  const [ticked, setTicked] = useState<PadDraft | null>(null);
  const tick = (sixtyFourths: number) => {
    const next = withEntry(pressTick(entry, sixtyFourths));
    setTicked(next);
    onDraft(next);
  };
  const isGoing = props.goesOn === true && ticked === draft && mayGoOn(entry, props.says.kind);
  useGoOn(isGoing ? draft : null, props.onNext);
  const isUntyped = isEmptyEntry(entry) && !entry.isNegative;
  const cornerKey = field?.kind === 'projection' ? 'sign' : entry.unit === 'in' ? 'ft' : 'point';
  const { nudge } = tapeTicks(stepMm);
  return (
    <div className="flex flex-1 flex-col">
      <div className="relative min-h-16 flex-1">{props.picture}</div>
      <div className="px-3.5">
        <div className="flex items-baseline justify-between gap-3">
          <h1 className="text-lead leading-tight font-bold">
            <FractionWords>{props.title}</FractionWords>
          </h1>
          <span className="shrink-0 text-note text-graphite">{props.toGo}</span>
        </div>
        <p className="text-note leading-snug text-graphite">
          <FractionWords>{props.detail}</FractionWords>
        </p>
      </div>
      {fields.length > 1 || props.otherWay ? <FieldChips {...props} /> : null}
      <div className="flex min-h-14 items-center justify-between gap-2 px-3.5">
        <output
          aria-label={field?.label ?? 'value'}
          className="text-reading font-bold tracking-tight"
        >
          <PadValue
            entry={entry}
            emptyText={<span className="inline-block h-10 w-0.5 bg-pine" />}
          />
        </output>
        <span className="flex items-center gap-2">
          {isUntyped && props.start ? (
            <StartKey start={props.start} onStart={(start) => put(start.entry)} />
          ) : nudge !== null && entry.unit === 'in' ? (
            <Nudges
              nudge={nudge}
              onNudge={(by) => put(pressTick(entry, nudged(entry.sixtyFourths, by)))}
            />
          ) : null}
          <UnitButton entry={entry} onUnit={props.onUnit} />
        </span>
      </div>
      <PadSaysBox says={props.says} onRule={props.onRule}>
        {props.lastKept && isUntyped ? (
          <span className="mt-0.5 block text-graphite">
            Kept: <FractionWords>{props.lastKept}</FractionWords>
          </span>
        ) : null}
      </PadSaysBox>
      <ActionRow actions={props.actions} />
      {entry.unit === 'in' ? (
        <TapeStrip stepMm={stepMm} sixtyFourths={entry.sixtyFourths} onTick={tick} />
      ) : (
        <div className="border-t border-ink" />
      )}
      <PadKeys
        cornerKey={cornerKey}
        onKey={(key) => put(pressKey(entry, key))}
        nextWords={props.nextWords}
        isGoing={isGoing}
        onNext={props.onNext}
        isBusy={props.isBusy}
        onAgain={props.onAgain}
      />
    </div>
  );
}

/** One touch for the digits that were the same beside it; the fraction is read. */
function StartKey({ start, onStart }: { start: SameStart; onStart: (start: SameStart) => void }) {
  return (
    <button
      type="button"
      aria-label={`begin with ${start.shown}, as beside it`}
      onClick={() => onStart(start)}
      className="min-h-thumb touch-manipulation border border-pine px-3 text-left leading-tight active:bg-tint"
    >
      <b className="block text-lead">{start.shown} …</b>
      <span className="text-note text-graphite">as beside it</span>
    </button>
  );
}

function FieldChips({ fields, draft, onDraft, unit, otherWay }: FieldPadProps) {
  return (
    <div className="mx-3.5 mt-1 flex border border-rule">
      {fields.length > 1
        ? fields.map(({ name, label }) => {
            const isActive = name === draft.active;
            return (
              <button
                key={name}
                type="button"
                aria-pressed={isActive}
                onClick={() => onDraft({ ...draft, active: name })}
                className={`min-h-11 flex-1 touch-manipulation border-r border-b-4 border-r-rule px-1.5 text-left text-note leading-tight ${
                  isActive ? 'border-b-pine bg-tint' : 'border-b-transparent'
                }`}
              >
                <span className="block text-graphite">{label}</span>
                <span className="font-bold">
                  <PadValue entry={draft.entries[name] ?? emptyEntry(unit)} />
                </span>
              </button>
            );
          })
        : null}
      {otherWay ? (
        <button
          type="button"
          onClick={otherWay.onPress}
          className="min-h-11 touch-manipulation px-2.5 text-note text-pine underline underline-offset-4"
        >
          {otherWay.words}
        </button>
      ) : null}
    </div>
  );
}

function Nudges({ nudge, onNudge }: { nudge: number; onNudge: (by: number) => void }) {
  const words = `1/${64 / nudge}`;
  const look = 'min-h-12 min-w-12 touch-manipulation border border-rule px-2 text-note';
  return (
    <>
      <button type="button" className={look} onClick={() => onNudge(-nudge)}>
        −{words}
      </button>
      <button type="button" className={look} onClick={() => onNudge(nudge)}>
        +{words}
      </button>
    </>
  );
}

function UnitButton({ entry, onUnit }: { entry: PadEntry; onUnit: () => void }) {
  if (entry.unit === 'deg') return null;
  const other = entry.unit === 'in' ? 'millimetres' : 'inches';
  return (
    <button
      type="button"
      aria-label={`${entry.unit}; change to ${other}`}
      onClick={onUnit}
      className="min-h-12 min-w-12 touch-manipulation text-lead text-graphite underline decoration-dotted underline-offset-4"
    >
      {entry.unit}
    </button>
  );
}

function ActionRow({ actions }: { actions: PadAction[] }) {
  return (
    <div className="mt-1 flex divide-x divide-rule border-t border-rule">
      {actions.map(({ key, label, value, onPress }) => (
        <button
          key={key}
          type="button"
          onClick={onPress}
          className="min-h-12 min-w-0 flex-1 touch-manipulation px-1.5 text-note leading-tight active:bg-tint"
        >
          {value === undefined ? (
            label
          ) : (
            <>
              <span className="block text-graphite">{label}</span>
              <span className="block truncate font-medium">{value}</span>
            </>
          )}
        </button>
      ))}
    </div>
  );
}
