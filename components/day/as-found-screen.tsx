'use client';

import { useMemo, useState } from 'react';
import { InFractions } from '@/components/fit/in-fractions';
import { newId } from '@/components/phone/new-id';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/text-field';
import { Verdict } from '@/components/ui/verdict';
import type { Reading } from '@/lib/contracts/readings';
import type { SheetView } from '@/lib/contracts/rooms';
import type { StopAsFound, StopView } from '@/lib/contracts/stops';
import { asFound } from '@/lib/days/as-found';
import { type AsFoundAsk, asFoundAsks, asFoundReading } from '@/lib/days/as-found-asks';
import { formatLength } from '@/lib/units/format-length';
import { parseLength } from '@/lib/units/parse-length';
import { type Crew, useCrew } from './crew-language';
import { KeepFailed } from './keep-failed';
import { ScreenFrame } from './screen-frame';
import { useKeptDraft } from './use-kept-draft';
import { useTell } from './use-tell';

type AsFoundScreenProps = { stop: StopView; roomId: string };

/** The corners and the fall of the floor once more, before anything is set by the sheet. */
export function AsFoundScreen({ stop, roomId }: AsFoundScreenProps) {
  const { words } = useCrew();
  const sheet = stop.sheets.find(({ wallBook }) => wallBook.room.id === roomId);
  if (!sheet) return <ScreenFrame title={words.asFound}>{words.notKept}</ScreenFrame>;
  return <Asking stop={stop} sheet={sheet} />;
}

function Asking({ stop, sheet }: { stop: StopView; sheet: SheetView }) {
  const crew = useCrew();
  const { words } = crew;
  const roomId = sheet.wallBook.room.id;
  const { tell, isFailed } = useTell(stop.visitId);
  const { draft, change, drop } = useKeptDraft<Record<string, string>>(
    `as-found:${stop.visitId}:${roomId}`,
    {},
  );
  const [problem, setProblem] = useState<string | null>(null);
  const last = stop.asFound.filter((one) => one.roomId === roomId).at(-1);
  const asks = asFoundAsks(sheet);
  if (!draft) return null;
  const compare = async () => {
    const setUpId = newId();
    const readings: Reading[] = [];
    for (const ask of asks) {
      const typed = (draft[ask.key] ?? '').trim();
      if (typed === '') continue;
      const value = typedValue(ask, typed, sheet.rules.unit);
      if (value === null) return setProblem(words.notRead(typed));
      const takenAt = new Date().toISOString();
      const { unit } = sheet.rules;
      const said = {
        id: newId(),
        roomId,
        takenAt,
        unit,
        typed: typed.slice(0, 80),
        setUpId,
        value,
      };
      readings.push(asFoundReading(ask, said));
    }
    if (readings.length === 0) return setProblem(words.typeOne);
    setProblem(null);
    const said = asFound(sheet, readings);
    if (await tell({ what: 'as-found', releaseId: sheet.release.id, readings, said })) drop();
  };
  return (
    <ScreenFrame
      title={words.asFound}
      meta={`${sheet.roomName}, ${words.revision(sheet.release.revision)}`}
    >
      {last ? <Outcome found={last} sheet={sheet} /> : null}
      <p>{words.asFoundLead}</p>
      {asks.map((ask) => (
        <TextField
          key={ask.key}
          label={askWords(ask, crew, sheet)}
          hint={<Hint ask={ask} sheet={sheet} />}
          value={draft[ask.key] ?? ''}
          inputMode={sheet.rules.unit === 'in' && ask.kind !== 'angle' ? 'text' : 'decimal'}
          autoComplete="off"
          className="min-h-thumb text-lead"
          onChange={(event) => change({ [ask.key]: event.target.value })}
        />
      ))}
      {problem ? (
        <p role="alert" className="text-chalk">
          {problem}
        </p>
      ) : null}
      <KeepFailed isFailed={isFailed} />
      <Button size="thumb" onClick={compare}>
        {words.compare}
      </Button>
    </ScreenFrame>
  );
}

function Outcome({ found: told, sheet }: { found: StopAsFound; sheet: SheetView }) {
  const { words, language, say } = useCrew();
  // The office tells it in English; what an older sheet was held against stays as it was told.
  const found = useMemo(
    () => (told.releaseId === sheet.release.id ? asFound(sheet, told.readings, language) : told),
    [told, sheet, language],
  );
  if (found.disagreements.length === 0) {
    return <Verdict kind="within">{words.agrees}</Verdict>;
  }
  return (
    <div role="status" className="flex flex-col gap-2 border-l-4 border-chalk bg-tint px-3 py-2">
      <Verdict kind="over">{words.differs}</Verdict>
      <ul className="list-disc pl-5">
        {found.disagreements.map((line) => (
          <li key={line}>
            <InFractions words={line} />
          </li>
        ))}
      </ul>
      {found.changes.length > 0 ? (
        <>
          <p className="font-bold">{words.changes}</p>
          <ul className="list-disc pl-5">
            {found.changes.map((line) => (
              <li key={line}>
                <InFractions words={say(line)} />
              </li>
            ))}
          </ul>
        </>
      ) : null}
      <p>{words.ringBeforeCutting}</p>
    </div>
  );
}

function Hint({ ask, sheet }: { ask: AsFoundAsk; sheet: SheetView }) {
  const { words } = useCrew();
  if (ask.kind === 'drop') return null;
  const was = ask.kind === 'angle' ? `${ask.wasDeg}°` : formatLength(ask.wasMm, sheet.rules);
  return <InFractions words={words.was(was)} />;
}

function askWords(ask: AsFoundAsk, { words }: Crew, { rules }: SheetView): string {
  const length = (mm: number) => formatLength(mm, rules);
  if (ask.kind === 'angle') return words.angleAsk(ask.corner);
  if (ask.kind === 'drop') return words.dropAsk(ask.at, ask.wall, length(ask.xMm));
  return words.diagonalAsk(ask.corner, `${length(ask.legLeftMm)} × ${length(ask.legRightMm)}`);
}

/** Millimetres, or degrees of an angle; null when it is neither. */
function typedValue(ask: AsFoundAsk, typed: string, unit: 'in' | 'mm'): number | null {
  if (ask.kind !== 'angle') return parseLength(typed, { unit }).value;
  const degrees = Number(typed.replace(',', '.').replace('°', ''));
  return degrees > 0 && degrees < 360 ? degrees : null;
}
