'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Glyph } from '@/components/ui/glyph';
import { TextareaField } from '@/components/ui/textarea-field';
import { TitleBlock } from '@/components/ui/title-block';
import type { ChecklistItem } from '@/lib/contracts/checklists';
import type { CheckAnswer } from '@/lib/contracts/day-events';
import type { StopCheck, StopView } from '@/lib/contracts/stops';
import { useCrew } from './crew-language';
import { KeepFailed } from './keep-failed';
import { ScreenFrame } from './screen-frame';
import { useTell } from './use-tell';

const times: ChecklistItem['when'][] = ['on-arrival', 'at-work', 'before-leaving'];
const answers: CheckAnswer[] = ['yes', 'no', 'not-here'];

/** The shop's list for this kind of visit; a "no" says why, and the office reads it. */
export function ChecklistScreen({ stop }: { stop: StopView }) {
  const { words } = useCrew();
  const { tell, isFailed } = useTell(stop.visitId);
  const [asksWhy, setAsksWhy] = useState<string | null>(null);
  const checkOf = (key: string) => stop.checks.find(({ item }) => item === key);
  const done = stop.checklist.filter(({ key }) => checkOf(key)).length;
  const say = async (item: string, answer: CheckAnswer, why = '') => {
    if (answer === 'no' && why === '' && asksWhy !== item) return setAsksWhy(item);
    if (await tell({ what: 'check', item, answer, words: why })) setAsksWhy(null);
  };
  return (
    <ScreenFrame title={words.checklist} meta={words.checked(done, stop.checklist.length)}>
      <KeepFailed isFailed={isFailed} />
      {times.map((when) => {
        const lines = stop.checklist.filter((item) => item.when === when);
        if (lines.length === 0) return null;
        return (
          <section key={when}>
            <TitleBlock title={words.when[when]} />
            <ul className="divide-y divide-rule border-b border-rule">
              {lines.map((item) => (
                <CheckLine
                  key={item.key}
                  item={item}
                  check={checkOf(item.key)}
                  asksWhy={asksWhy === item.key}
                  onSay={(answer, why) => void say(item.key, answer, why)}
                />
              ))}
            </ul>
          </section>
        );
      })}
    </ScreenFrame>
  );
}

type CheckLineProps = {
  item: ChecklistItem;
  check: StopCheck | undefined;
  asksWhy: boolean;
  onSay: (answer: CheckAnswer, why?: string) => void;
};

function CheckLine({ item, check, asksWhy, onSay }: CheckLineProps) {
  const { words, language } = useCrew();
  const [why, setWhy] = useState(check?.words ?? '');
  const line = item.words[language] || item.words.en;
  return (
    <li className={`py-3 ${item.isCaution ? 'border-l-4 border-l-chalk pl-3' : ''}`}>
      <fieldset>
        <legend className="pb-2 text-lead leading-tight">{line}</legend>
        <div className="grid grid-cols-3 gap-2">
          {answers.map((answer) => {
            const isChosen = check?.answer === answer;
            return (
              <button
                key={answer}
                type="button"
                aria-pressed={isChosen}
                onClick={() => onSay(answer)}
                className={`flex min-h-thumb touch-manipulation items-center justify-center gap-2 rounded border active:bg-tint ${
                  isChosen ? 'border-2 border-pine bg-tint font-bold' : 'border-graphite'
                }`}
              >
                {isChosen ? (
                  <Glyph
                    name={answer === 'no' ? 'problem' : 'confirmed'}
                    className={answer === 'no' ? 'text-chalk' : 'text-moss'}
                  />
                ) : null}
                {words.answers[answer]}
              </button>
            );
          })}
        </div>
      </fieldset>
      {asksWhy ? (
        <div className="flex flex-col gap-2 pt-3">
          <TextareaField
            label={words.whyNo}
            value={why}
            maxLength={400}
            onChange={(event) => setWhy(event.target.value)}
          />
          <Button size="thumb" onClick={() => onSay('no', why.trim() || '—')}>
            {words.save}
          </Button>
        </div>
      ) : check?.answer === 'no' ? (
        <p className="pt-2 text-chalk">{check.words}</p>
      ) : null}
    </li>
  );
}
