'use client';

import { useState } from 'react';
import { SelectField } from '@/components/ui/select-field';
import { TitleBlock } from '@/components/ui/title-block';
import type { WordingsView } from '@/lib/contracts/wordings';
import {
  type Occasion,
  occasions,
  occasionWhen,
  occasionWords,
  parseOccasion,
} from '@/lib/messages/occasions';
import type { Language } from '@/lib/time/text-locale';
import { MessageSettingsForm } from './message-settings-form';
import { TestForm } from './test-form';
import { WordingEditor } from './wording-editor';

type Props = WordingsView & {
  shop: { name: string; phone: string; email: string };
  mayChange: boolean;
};

/** The shop's own words, one occasion and language at a time; what they cost; and a test to one's own phone. */
export function WordingScreen({ wordings, settings, shop, mayChange }: Props) {
  const [occasion, setOccasion] = useState<Occasion>('booked');
  const [language, setLanguage] = useState<Language>('en');
  const wording = wordings.find((each) => each.occasion === occasion && each.language === language);
  const price =
    settings.segmentPrice === null
      ? null
      : { perSegment: settings.segmentPrice, currency: settings.currency };
  const isOwn = (each: string) => wordings.some((one) => one.occasion === each && one.isOwn);
  return (
    <>
      <TitleBlock level={1} title="Wording" meta="what customers are told" className="mb-4" />
      <div className="grid max-w-3xl grid-cols-2 gap-3">
        <SelectField
          label="Occasion"
          value={occasion}
          onChange={(event) => setOccasion(parseOccasion(event.target.value) ?? occasion)}
          options={occasions.map((each) => ({
            value: each,
            label: `${occasionWords[each]}${isOwn(each) ? ' · your words' : ''}`,
          }))}
        />
        <SelectField
          label="Language"
          value={language}
          onChange={(event) => setLanguage(event.target.value === 'es' ? 'es' : 'en')}
          options={[
            { value: 'en', label: 'English' },
            { value: 'es', label: 'Spanish' },
          ]}
        />
      </div>
      <p className="my-3 text-graphite">
        {occasionWhen[occasion]}
        {settings.silentOn.includes(occasion) ? ' Switched off by you.' : ''}
      </p>
      {wording ? (
        <WordingEditor
          key={`${occasion} ${language} ${wording.sms} ${wording.subject} ${wording.email}`}
          wording={wording}
          shop={shop}
          price={price}
          mayChange={mayChange}
        />
      ) : null}
      <div className="mt-10 grid grid-cols-1 items-start gap-x-10 gap-y-8 lg:grid-cols-2">
        <MessageSettingsForm settings={settings} mayChange={mayChange} />
        {mayChange ? <TestForm shop={shop} /> : null}
      </div>
    </>
  );
}
