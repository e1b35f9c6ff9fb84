'use client';

import { useState } from 'react';
import { ZoneField } from '@/components/door/zone-field';
import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import { TitleBlock } from '@/components/ui/title-block';
import type { ShopSettings } from '@/lib/contracts/shop-rules';
import type { ErrorOf } from './rule-field';

/** Who the shop is to its customers, and what it reads and cuts in. */
export function ShopPart({ settings, errorOf }: { settings: ShopSettings; errorOf: ErrorOf }) {
  const { fit } = settings;
  const [unit, setUnit] = useState(fit.unit);
  return (
    <section className="flex flex-col gap-3">
      <TitleBlock title="The shop" />
      <TextField
        label="Name"
        name="name"
        hint="Stands on the customer’s page and in every message."
        defaultValue={settings.name}
        required
        error={errorOf('name')}
      />
      <div className="grid gap-3 sm:grid-cols-2">
        <TextField
          label="Phone"
          name="phone"
          type="tel"
          hint="The number that customers are asked to call."
          defaultValue={settings.phone}
          error={errorOf('phone')}
        />
        <TextField
          label="E-mail"
          name="email"
          type="email"
          hint="Where customers’ answers by e-mail go."
          defaultValue={settings.email}
          error={errorOf('email')}
        />
      </div>
      <ZoneField start={settings.zone} error={errorOf('zone')} />
      <div className="grid gap-3 sm:grid-cols-2">
        <SelectField
          label="Lengths"
          name="unit"
          hint="What is typed, shown and printed."
          value={unit}
          onChange={(event) => setUnit(event.target.value === 'mm' ? 'mm' : 'in')}
          options={[
            { value: 'in', label: 'inches, fractions' },
            { value: 'mm', label: 'millimetres' },
          ]}
        />
        <SelectField
          key={unit}
          label="Cut sizes to"
          name="step"
          hint="Blanks are rounded up to it, openings down."
          defaultValue={unit === fit.unit ? String(fit.stepMm) : undefined}
          options={steps[unit]}
        />
      </div>
    </section>
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
