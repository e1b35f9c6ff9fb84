'use client';

import type { ReactNode } from 'react';
import { crewColour } from '@/components/diary/crew-colour';
import { Button } from '@/components/ui/button';
import type { CrewSetting } from '@/lib/contracts/crews';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { patternWords, weekdayWords } from './pattern-words';

type CrewLineProps = {
  crew: CrewSetting;
  /** Left out for those who may only look. */
  onEdit?: () => void;
  isOpen: boolean;
  /** Its calendar addresses. */
  children?: ReactNode;
};

/** One crew in three lines: who goes, what for, when and from where. */
export function CrewLine({ crew, onEdit, isOpen, children }: CrewLineProps) {
  const { name, does, kinds, members, base } = crew;
  return (
    <div className="grid grid-cols-[auto_1fr_auto] items-baseline gap-x-3 border-b border-rule pt-2 pb-1">
      <span
        aria-hidden="true"
        className="size-3 self-center rounded"
        style={{ background: crewColour(crew.colour) }}
      />
      <p>
        <b>{name}</b>{' '}
        <span className="text-graphite">
          {kinds.length > 0
            ? kinds.map((kind) => visitKindWords[kind].toLowerCase()).join(', ')
            : does === 'measure'
              ? 'measures'
              : 'installs'}
        </span>
      </p>
      {onEdit ? (
        <Button look="plain" onClick={onEdit} aria-expanded={isOpen} aria-label={`Change ${name}`}>
          {isOpen ? 'Close' : 'Change'}
        </Button>
      ) : (
        <span />
      )}
      <p className="col-start-2">{members.length > 0 ? membersWords(members) : 'nobody yet'}</p>
      <p className="col-start-2 text-note text-graphite tabular-nums">
        {patternWords(crew.pattern)}
        {crew.hasOwnPattern ? '' : ' (the shop’s hours)'}
        {base.address ? ` · from ${base.address}` : ''}
        {base.place ? '' : ' · no base on the map: drives are guessed'}
      </p>
      {children ? <div className="col-span-2 col-start-2 -ml-3.5">{children}</div> : null}
    </div>
  );
}

function membersWords(members: CrewSetting['members']): string {
  return members
    .map(({ name, weekdays }) => (weekdays ? `${name} (${weekdayWords(weekdays)})` : name))
    .join(', ');
}
