'use client';

import { SelectField } from '@/components/ui/select-field';
import type { Run, RunEnd } from '@/lib/contracts/runs';
import type { FitRules } from '@/lib/contracts/shop-rules';
import { LengthField } from './length-field';

type EndFieldsProps = {
  side: 'left' | 'right';
  run: Run;
  /** The other runs of the room: one may stand at the corner. */
  others: readonly Run[];
  rules: FitRules;
  onEnd: (end: RunEnd) => void;
  error?: string;
};

/** What a run meets at one end. */
export function EndFields({ side, run, others, rules, onEnd, error }: EndFieldsProps) {
  const end = run[side];
  const begin = (kind: string): RunEnd => {
    const [other] = others;
    const xMm = 'xMm' in end ? end.xMm : 'limitMm' in end ? end.limitMm : 0;
    if (kind === 'open') return { kind, limitMm: xMm };
    if (kind === 'casing' || kind === 'existing') return { kind, xMm };
    if (kind === 'run' && other) return { kind, runId: other.id, through: 'other' };
    return { kind: 'wall' };
  };
  return (
    <fieldset className="flex flex-col gap-3 border-l border-rule pl-3">
      <legend className="sr-only">{side} end</legend>
      <SelectField
        label={side === 'left' ? 'Left end meets' : 'Right end meets'}
        value={end.kind}
        onChange={(event) => onEnd(begin(event.target.value))}
        options={[
          { value: 'wall', label: 'the wall at the corner' },
          { value: 'open', label: 'nothing: a finished end' },
          { value: 'run', label: 'another run at the corner', isDisabled: others.length === 0 },
          { value: 'casing', label: 'a casing' },
          { value: 'existing', label: 'a cabinet already set' },
        ]}
      />
      {end.kind === 'open' ? (
        <LengthField
          label="Not past, from the left corner"
          mm={end.limitMm}
          unit={rules.unit}
          kind="position"
          onMm={(limitMm) => onEnd({ ...end, limitMm })}
        />
      ) : null}
      {end.kind === 'casing' || end.kind === 'existing' ? (
        <LengthField
          label="It stands at, from the left corner"
          mm={end.xMm}
          unit={rules.unit}
          kind="position"
          onMm={(xMm) => onEnd({ ...end, xMm })}
        />
      ) : null}
      {end.kind === 'run' ? (
        <>
          <SelectField
            label="Which run"
            value={end.runId}
            onChange={(event) => onEnd({ ...end, runId: event.target.value })}
            options={others.map(({ id, name }) => ({ value: id, label: name }))}
            error={error}
          />
          <SelectField
            label="Through the corner goes"
            value={end.through}
            onChange={(event) => {
              const through = throughs.find(({ value }) => value === event.target.value);
              if (through) onEnd({ ...end, through: through.value });
            }}
            options={throughs.map(({ value, label }) => ({ value, label }))}
          />
        </>
      ) : null}
    </fieldset>
  );
}

const throughs = [
  { value: 'this', label: 'this run' },
  { value: 'other', label: 'the other run' },
  { value: 'both-stop', label: 'neither: both stop' },
  { value: 'corner-unit', label: 'a corner unit of both' },
] as const;
