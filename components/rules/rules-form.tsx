'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { useFormRequest } from '@/components/door/use-form-request';
import { askServer, RequestProblem } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { CheckField } from '@/components/ui/check-field';
import { FormError } from '@/components/ui/form-error';
import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import { TitleBlock } from '@/components/ui/title-block';
import { showToast } from '@/components/ui/toast-store';
import type { RulePreview } from '@/lib/contracts/rule-changes';
import type { ChangeShopRulesInput, ShopSettings } from '@/lib/contracts/shop-rules';
import { apiPaths } from '@/lib/paths';
import { lengthRuleGroups } from '@/lib/rules/length-rules';
import { formatLength } from '@/lib/units/format-length';
import { ChangePreview } from './change-preview';
import { OpeningWeights } from './opening-weights';
import { readRules } from './read-rules';
import { SheetGoods } from './sheet-goods';

const weekdays = ['Monday', 'Tuesday', 'Wednesday', 'Thursday', 'Friday', 'Saturday', 'Sunday'];

/** Shop rules on one sheet: the shop, its hours, and its own lengths, typed in its own unit. */
export function RulesForm({ settings, mayChange }: { settings: ShopSettings; mayChange: boolean }) {
  const router = useRouter();
  const [unit, setUnit] = useState(settings.fit.unit);
  const [looked, setLooked] = useState<{ preview: RulePreview; body: ChangeShopRulesInput } | null>(
    null,
  );
  const form = useFormRequest(
    async (fields) => {
      const { body, errors } = readRules(fields, settings);
      if (!body) {
        throw new RequestProblem({
          type: 'urn:setwell:problem:not-understood',
          title: 'Some lengths could not be read.',
          status: 422,
          detail: 'Nothing was changed.',
          errors,
        });
      }
      const asked = { method: 'POST', body } as const;
      const preview = await askServer<RulePreview>(apiPaths.rulesPreview(), asked);
      if (preview.changes.length === 0) showToast({ text: 'Nothing is changed yet' });
      else setLooked({ preview, body });
    },
    () => form.rest(),
  );
  const saving = useFormRequest(
    async () => {
      await askServer(apiPaths.rules(), { method: 'PATCH', body: looked?.body });
    },
    () => {
      showToast({ text: 'Shop rules saved. Released sheets keep the rules they were made by.' });
      setLooked(null);
      saving.rest();
      router.refresh();
    },
  );
  const { fit, booking } = settings;
  const shown = (mm: number) => formatLength(mm, { unit: fit.unit, stepMm: fit.stepMm });
  return (
    <form onSubmit={form.submit}>
      <fieldset disabled={!mayChange} className="grid gap-x-10 gap-y-8 xl:grid-cols-2">
        <section className="flex flex-col gap-3">
          <TitleBlock title="The shop" />
          <TextField
            label="Name"
            name="name"
            defaultValue={settings.name}
            required
            error={form.errorOf('name')}
          />
          <div className="grid grid-cols-2 gap-3">
            <TextField
              label="Phone"
              name="phone"
              type="tel"
              defaultValue={settings.phone}
              error={form.errorOf('phone')}
            />
            <TextField
              label="E-mail"
              name="email"
              type="email"
              defaultValue={settings.email}
              error={form.errorOf('email')}
            />
          </div>
          <div className="grid grid-cols-2 gap-3">
            <TextField
              label="Time zone"
              name="zone"
              defaultValue={settings.zone}
              required
              error={form.errorOf('zone')}
            />
            <SelectField
              label="Lengths"
              name="unit"
              value={unit}
              onChange={(event) => setUnit(event.target.value === 'mm' ? 'mm' : 'in')}
              options={[
                { value: 'in', label: 'inches, fractions' },
                { value: 'mm', label: 'millimetres' },
              ]}
            />
          </div>
          <SelectField
            key={unit}
            label="Cut sizes to"
            name="step"
            hint="Blanks are rounded up to it, openings down."
            defaultValue={unit === fit.unit ? String(fit.stepMm) : undefined}
            options={steps[unit]}
          />
        </section>
        <section className="flex flex-col gap-3">
          <TitleBlock title="Hours and booking" />
          <div className="grid grid-cols-2 gap-3 sm:grid-cols-4">
            <TextField
              label="Day starts"
              name="dayStart"
              type="time"
              defaultValue={booking.dayStart}
              error={form.errorOf('booking.dayStart')}
            />
            <TextField
              label="Day ends"
              name="dayEnd"
              type="time"
              defaultValue={booking.dayEnd}
              error={form.errorOf('booking.dayEnd')}
            />
            <TextField
              label="No texts from"
              name="quietFrom"
              type="time"
              defaultValue={booking.quietFrom}
              error={form.errorOf('booking.quietFrom')}
            />
            <TextField
              label="until"
              name="quietUntil"
              type="time"
              defaultValue={booking.quietUntil}
              error={form.errorOf('booking.quietUntil')}
            />
          </div>
          <fieldset>
            <legend className="font-medium">Days worked</legend>
            <div className="flex flex-wrap gap-x-5">
              {weekdays.map((day, index) => (
                <CheckField
                  key={day}
                  label={day}
                  name={`workday${index + 1}`}
                  value="yes"
                  defaultChecked={booking.workdays.includes(index + 1)}
                />
              ))}
            </div>
          </fieldset>
          <div className="grid grid-cols-2 gap-3">
            <TextField
              label="Arrival window, minutes"
              name="windowMinutes"
              type="number"
              defaultValue={booking.windowMinutes}
              error={form.errorOf('booking.windowMinutes')}
            />
            <TextField
              label="Release to ready, working days"
              name="leadWorkdays"
              type="number"
              defaultValue={booking.leadWorkdays}
              error={form.errorOf('booking.leadWorkdays')}
            />
          </div>
          <TextField
            label="Closed days"
            name="closedDays"
            hint="As 2026-12-24, with spaces between."
            defaultValue={booking.closedDays.join(' ')}
            error={form.errorOf('booking.closedDays')}
          />
          <OpeningWeights booking={booking} errorOf={form.errorOf} />
          <TextField
            label="Forget a customer after so many years"
            name="customerYears"
            type="number"
            hint="After the last visit of jobs that are signed off or called off. Empty: never by itself."
            defaultValue={settings.keeping?.customerYears ?? ''}
            error={form.errorOf('keeping.customerYears')}
          />
        </section>
        {lengthRuleGroups.map((group) => (
          <section key={group.title}>
            <TitleBlock
              title={group.title}
              meta={`${fit.unit === 'in' ? 'inches' : 'mm'}, starts from common practice`}
            />
            <div className="grid gap-3 py-3 sm:grid-cols-2">
              {group.rules.map(({ rule, label, affects }) => (
                <TextField
                  key={rule}
                  label={label}
                  name={rule}
                  defaultValue={shown(fit[rule])}
                  hint={`moves ${affects}`}
                  error={form.errorOf(rule) ?? form.errorOf(`fit.${rule}`)}
                />
              ))}
            </div>
          </section>
        ))}
        <SheetGoods fit={fit} errorOf={form.errorOf} />
      </fieldset>
      <FormError problem={form.problem} shownFields={Object.keys(form.problem?.errors ?? {})} />
      <FormError problem={saving.problem} shownFields={[]} />
      {looked ? (
        <ChangePreview
          preview={looked.preview}
          isBusy={saving.isBusy}
          onSave={() => saving.run({})}
          onClose={() => setLooked(null)}
        />
      ) : null}
      {mayChange ? (
        <Button type="submit" className="mt-4" busyText={form.isBusy ? 'Looking…' : undefined}>
          Save the rules
        </Button>
      ) : (
        <p className="mt-4 text-graphite">The owner changes these.</p>
      )}
    </form>
  );
}

const steps = {
  in: [
    { value: String(25.4 / 16), label: '1/16 in' },
    { value: String(25.4 / 32), label: '1/32 in' },
  ],
  mm: [
    { value: '1', label: '1 mm' },
    { value: '0.5', label: '0.5 mm' },
  ],
};
