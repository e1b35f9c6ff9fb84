'use client';

import { useState } from 'react';
import { signIn } from '@/components/door/auth-requests';
import { problemOf } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { FormError } from '@/components/ui/form-error';
import { roleWords } from '@/lib/permissions';
import type { ProblemDetails } from '@/lib/problem-details';
import { type ChainStep, chainSteps } from './chain-steps';

type Person = { role: string; email: string; password: string };

/** The whole chain, step by step: each opens beside its words as the person who does it. */
export function ChainGuide({ people }: { people: Person[] }) {
  const [current, setCurrent] = useState<{ step: ChainStep; key: number } | null>(null);
  const [problem, setProblem] = useState<ProblemDetails | null>(null);
  const [opening, setOpening] = useState<ChainStep | null>(null);

  async function open(step: ChainStep) {
    setOpening(step);
    setProblem(null);
    try {
      const person =
        step.role && people.find(({ role }) => role === roleWords[step.role ?? 'owner']);
      if (person) await signIn(person);
      setCurrent({ step, key: Date.now() });
    } catch (caught) {
      setProblem(problemOf(caught));
    } finally {
      setOpening(null);
    }
  }

  return (
    <div className="grid gap-6 xl:grid-cols-[22rem_minmax(0,1fr)]">
      <ol className="flex flex-col gap-1">
        {chainSteps.map((step, index) => {
          const isShown = current?.step === step;
          return (
            <li
              key={step.title}
              className={`border-l-4 py-2 pl-4 ${isShown ? 'border-pine' : 'border-rule'}`}
            >
              <h2 className="font-bold">
                {index + 1}. {step.title}
              </h2>
              {step.does.map((line) => (
                <p key={line} className="mt-1 text-graphite">
                  {line}
                </p>
              ))}
              <Button
                className="mt-2"
                look={isShown ? 'line' : 'fill'}
                onClick={() => open(step)}
                busyText={opening === step ? 'Opening…' : undefined}
              >
                {step.role ? `Open as ${roleWords[step.role].toLowerCase()}` : 'Open the phone'}
              </Button>
            </li>
          );
        })}
        <FormError problem={problem} />
      </ol>
      {current ? (
        <iframe
          key={current.key}
          src={current.step.path}
          title={current.step.title}
          className={
            current.step.frame === 'phone'
              ? 'mx-auto h-[844px] w-[390px] max-w-full rounded border-8 border-ink bg-sheet'
              : 'h-[56rem] w-full rounded border border-ink bg-sheet'
          }
        />
      ) : (
        <p className="flex min-h-60 items-center justify-center border border-dashed border-graphite px-6 text-graphite">
          Each step opens here, as the person who does it. Begin with the first.
        </p>
      )}
    </div>
  );
}
