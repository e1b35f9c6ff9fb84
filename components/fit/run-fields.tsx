'use client';

import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import type { Run } from '@/lib/contracts/runs';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { Room } from '@/lib/contracts/wall-book';
import { newRun } from '@/lib/sheet/new-run';
import { wallsOf } from '@/lib/sheet/room-names';
import { unitWords } from '@/lib/sheet/unit-words';
import { type Region, tradeName, tradeWord } from '@/lib/words/trade';
import { LengthField } from './length-field';

type RunFieldsProps = {
  run: Run;
  room: Room;
  rules: FitRules;
  onRun: (change: Partial<Run>) => void;
  errorOf: (field: string) => string | undefined;
};

/** Where a run stands, how deep and high, and where its slack goes. */
export function RunFields({ run, room, rules, onRun, errorOf }: RunFieldsProps) {
  const length = (label: string, field: 'carcassDepthMm' | 'doorMm' | 'z0Mm' | 'z1Mm') => (
    <LengthField
      label={label}
      mm={run[field]}
      unit={rules.unit}
      onMm={(mm) => onRun({ [field]: mm })}
      error={errorOf(field)}
    />
  );
  return (
    <>
      <TextField
        label="Name"
        value={run.name}
        maxLength={40}
        required
        onChange={(event) => onRun({ name: event.target.value })}
        error={errorOf('name')}
      />
      <div className="grid grid-cols-2 gap-3">
        <SelectField
          label="Wall"
          value={run.wallId}
          onChange={(event) => onRun({ wallId: event.target.value })}
          options={wallsOf(room).map(({ wall }) => ({ value: wall.id, label: wall.name }))}
          error={errorOf('wallId')}
        />
        <SelectField
          label="Level"
          value={run.level}
          onChange={(event) => {
            const level = levels.find((known) => known.value === event.target.value)?.value;
            if (!level) return;
            const { z0Mm, z1Mm, carcassDepthMm } = newRun(rules, { ...run, level });
            onRun({ level, z0Mm, z1Mm, carcassDepthMm });
          }}
          options={levels.map(({ value, words }) => ({ value, label: words(rules.region) }))}
        />
        {length('Box depth', 'carcassDepthMm')}
        {length('Door', 'doorMm')}
        {length('Foot, over the high point', 'z0Mm')}
        {length('Top', 'z1Mm')}
      </div>
      <SelectField
        label="Over the boxes"
        value={run.overBoxes ?? ''}
        onChange={(event) => {
          const overBoxes = closings.find((one) => one === event.target.value);
          onRun({ overBoxes });
        }}
        options={[
          { value: '', label: 'a filler, where they end near the ceiling' },
          { value: 'filler', label: 'a filler to the ceiling' },
          { value: 'crown', label: tradeWord('crown', rules.region) },
          { value: 'open', label: 'nothing: open' },
        ]}
      />
      <ShareFields run={run} rules={rules} onRun={onRun} error={errorOf('share.unitId')} />
      <TextField
        label={tradeName('counter', rules.region)}
        hint="Runs with the same word here stand under one top and share its height."
        value={run.counterGroup ?? ''}
        maxLength={20}
        isOptional
        onChange={(event) => onRun({ counterGroup: event.target.value || null })}
      />
    </>
  );
}

const closings = ['filler', 'crown', 'open'] as const;

const levels = [
  { value: 'base', words: (region: Region) => `base, on a ${tradeWord('kick', region)}` },
  { value: 'wall', words: () => 'hung on the wall' },
  { value: 'tall', words: (region: Region) => `tall, on a ${tradeWord('kick', region)}` },
] as const;

function ShareFields({
  run,
  rules,
  onRun,
  error,
}: Pick<RunFieldsProps, 'run' | 'rules' | 'onRun'> & { error?: string }) {
  const { share } = run;
  const [first] = run.units;
  return (
    <div className="grid grid-cols-2 gap-3">
      <SelectField
        label="Slack goes"
        value={share.how}
        onChange={(event) => {
          const how = event.target.value;
          if (how === 'equal' || how === 'left' || how === 'right') onRun({ share: { how } });
          if (how === 'centred' && first) {
            onRun({ share: { how, unitId: first.id, markMm: 1_000 } });
          }
        }}
        options={[
          { value: 'equal', label: 'to both fillers alike' },
          { value: 'left', label: 'to the left filler' },
          { value: 'right', label: 'to the right filler' },
          { value: 'centred', label: 'a unit on a mark', isDisabled: !first },
        ]}
      />
      {share.how === 'centred' ? (
        <>
          <SelectField
            label="Unit on the mark"
            value={share.unitId}
            onChange={(event) => onRun({ share: { ...share, unitId: event.target.value } })}
            options={run.units.map((unit, index) => ({
              value: unit.id,
              label: `${index + 1}: ${unitWords(unit, rules.region)}`,
            }))}
            error={error}
          />
          <LengthField
            label="Mark, from the left corner"
            mm={share.markMm}
            unit={rules.unit}
            kind="position"
            onMm={(markMm) => onRun({ share: { ...share, markMm } })}
          />
        </>
      ) : null}
    </div>
  );
}
