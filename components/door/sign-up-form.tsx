'use client';

import { useState, useSyncExternalStore } from 'react';
import { Button } from '@/components/ui/button';
import { FormError } from '@/components/ui/form-error';
import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import type { CreateShopInput } from '@/lib/contracts/people';
import { paths } from '@/lib/paths';
import { signUpShop } from './auth-requests';
import { useFormRequest } from './use-form-request';
import { ZoneField } from './zone-field';

type Region = CreateShopInput['region'];
type Unit = CreateShopInput['unit'];

const regions: { value: Region; label: string; unit: Unit }[] = [
  { value: 'US', label: 'United States', unit: 'in' },
  { value: 'UK', label: 'United Kingdom and Ireland', unit: 'mm' },
  { value: 'AU', label: 'Australia and New Zealand', unit: 'mm' },
  { value: 'EU', label: 'Continental Europe', unit: 'mm' },
];

const fields = ['shopName', 'region', 'zone', 'unit', 'personName', 'email', 'password'];

/** A new shop and its owner. The region gives the starting rules and words; all of it can be changed later. */
export function SignUpForm() {
  const [region, setRegion] = useState<Region>('US');
  const [chosenUnit, setChosenUnit] = useState<Unit | null>(null);
  const unit = chosenUnit ?? regions.find(({ value }) => value === region)?.unit ?? 'mm';
  const zone = useSyncExternalStore(neverChanges, browserZone, () => '');

  const form = useFormRequest(
    ({ shopName = '', zone = '', personName = '', email = '', password = '' }) =>
      signUpShop({ shopName, region, zone, unit, personName, email: email.trim(), password }),
    () => window.location.assign(paths.signIn(paths.start())),
  );
  return (
    <form onSubmit={form.submit} className="flex flex-col gap-4">
      <TextField
        label="The shop's name"
        name="shopName"
        autoComplete="organization"
        hint="As customers know it; it stands on their page and in every message."
        required
        maxLength={80}
        error={form.errorOf('shopName')}
      />
      <SelectField
        label="Where the shop works"
        name="region"
        value={region}
        onChange={(event) => {
          const chosen = regions.find(({ value }) => value === event.target.value);
          if (chosen) setRegion(chosen.value);
        }}
        options={regions}
        error={form.errorOf('region')}
      />
      <SelectField
        label="The shop reads its tapes in"
        name="unit"
        value={unit}
        onChange={(event) => setChosenUnit(event.target.value === 'in' ? 'in' : 'mm')}
        options={[
          { value: 'in', label: 'inches and fractions' },
          { value: 'mm', label: 'millimetres' },
        ]}
        error={form.errorOf('unit')}
      />
      <ZoneField key={zone} start={zone} error={form.errorOf('zone')} />
      <TextField
        label="Your name"
        name="personName"
        autoComplete="name"
        required
        maxLength={80}
        error={form.errorOf('personName')}
      />
      <TextField
        label="Your e-mail"
        name="email"
        type="email"
        autoComplete="username"
        required
        error={form.errorOf('email')}
      />
      <TextField
        label="A password"
        name="password"
        type="password"
        autoComplete="new-password"
        hint="At least 10 characters. A few words are easier than signs."
        minLength={10}
        required
        error={form.errorOf('password')}
      />
      <FormError problem={form.problem} shownFields={fields} />
      <Button type="submit" size="thumb" busyText={form.isBusy ? 'Opening the shop…' : undefined}>
        Open the shop
      </Button>
    </form>
  );
}

const neverChanges = () => () => undefined;
const browserZone = () => Intl.DateTimeFormat().resolvedOptions().timeZone;
