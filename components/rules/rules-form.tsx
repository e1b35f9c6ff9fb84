'use client';

import { useFormRequest } from '@/components/door/use-form-request';
import { RequestProblem } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { FormError } from '@/components/ui/form-error';
import type { ShopSettings } from '@/lib/contracts/shop-rules';
import { BookingPart } from './booking-part';
import { LengthParts } from './length-parts';
import { OpeningWeights } from './opening-weights';
import { readRules } from './read-rules';
import { SheetGoods } from './sheet-goods';
import { ShopPart } from './shop-part';
import { useRuleChange } from './use-rule-change';

type RulesFormProps = { settings: ShopSettings; mayChange: boolean };

/** Shop rules on one sheet; nothing is saved before it was seen what it changes. */
export function RulesForm({ settings, mayChange }: RulesFormProps) {
  const { look, dialog } = useRuleChange(settings);
  const form = useFormRequest(
    async (fields) => {
      const { body, errors } = readRules(fields, settings);
      if (!body) throw notRead(errors);
      await look(body);
    },
    () => form.rest(),
  );
  const { fit, booking } = settings;
  const { errorOf, problem } = form;
  return (
    <form onSubmit={form.submit}>
      <fieldset disabled={!mayChange} className="gap-x-10 *:mb-8 *:break-inside-avoid xl:columns-2">
        <ShopPart settings={settings} errorOf={errorOf} />
        <BookingPart settings={settings} errorOf={errorOf} />
        <OpeningWeights booking={booking} errorOf={errorOf} />
        <LengthParts fit={fit} errorOf={errorOf} />
        <SheetGoods fit={fit} errorOf={errorOf} />
      </fieldset>
      {mayChange ? (
        <div className="sticky bottom-0 flex flex-wrap items-center gap-x-5 gap-y-2 border-t border-ink bg-paper py-3">
          <Button type="submit" busyText={form.isBusy ? 'Looking…' : undefined}>
            See what this changes
          </Button>
          <FormError problem={problem} shownFields={Object.keys(problem?.errors ?? {})} />
        </div>
      ) : (
        <p className="text-graphite">The owner changes these.</p>
      )}
      {dialog}
    </form>
  );
}

function notRead(errors: Record<string, string>): RequestProblem {
  return new RequestProblem({
    type: 'urn:setwell:problem:not-understood',
    title: 'Some lengths could not be read.',
    status: 422,
    detail: 'Nothing was changed.',
    errors,
  });
}
