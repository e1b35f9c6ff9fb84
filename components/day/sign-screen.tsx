'use client';

import { useState } from 'react';
import { useHolder } from '@/components/phone/phone-person';
import { chooseLanguage } from '@/components/phone/spoken-language';
import { useTyping } from '@/components/phone/use-typing';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/text-field';
import type { PenStrokes, SignedSnag } from '@/lib/contracts/sign-offs';
import type { StopView } from '@/lib/contracts/stops';
import type { TodayVisit } from '@/lib/contracts/visits';
import { type CrewLanguage, crewWords } from '@/lib/words/crew';
import { useCrew } from './crew-language';
import { KeepFailed } from './keep-failed';
import { ScreenFrame } from './screen-frame';
import { SignPad } from './sign-pad';
import { SignedView } from './signed-view';
import { goToStop } from './stop-place';
import { useReport } from './use-report';
import { useTell } from './use-tell';

/** The customer reads what is open and signs for it; in their own language, at one tap. */
export function SignScreen({ visit, stop }: { visit: TodayVisit; stop: StopView }) {
  const { words, language } = useCrew();
  const { shopName } = useHolder();
  const { tell, isFailed } = useTell(visit.id);
  const [name, setName] = useState(visit.customerName);
  const [strokes, setStrokes] = useState<PenStrokes>([]);
  const [cleared, setCleared] = useState(0);
  const [asks, setAsks] = useState<'name' | 'sign' | null>(null);
  useTyping(strokes.length > 0 && stop.signOff === null);

  if (stop.signOff) {
    return (
      <ScreenFrame title={words.signTitle}>
        <SignedView signOff={stop.signOff} />
        <DoneHere visit={visit} />
      </ScreenFrame>
    );
  }
  const open = stop.snags.filter(({ closedAt }) => closedAt === null);
  const statement =
    visit.kind === 'delivery' ? words.signDelivery(shopName) : words.signStatement(shopName);
  const listed: SignedSnag[] = open.map(
    ({ id, kind, roomName, place, words: what, mender, dueOn }) => ({
      id,
      kind,
      place: [roomName, place].filter(Boolean).join(', ').slice(0, 160),
      words: what,
      mender,
      dueOn,
    }),
  );
  const clear = () => {
    setStrokes([]);
    setCleared(cleared + 1);
  };
  const sign = async () => {
    if (name.trim() === '') return setAsks('name');
    if (strokes.length === 0) return setAsks('sign');
    await tell({
      what: 'sign-off',
      name: name.trim(),
      language,
      statement,
      strokes,
      snags: listed,
    });
  };
  return (
    <ScreenFrame title={words.signTitle} meta={visit.jobTitle}>
      <OtherLanguage current={language} />
      <p className="text-lead">{statement}</p>
      <div>
        <p className="font-bold">{words.openHere(open.length)}</p>
        <ul className="list-disc pl-5">
          {listed.map((snag) => (
            <li key={snag.id} className="py-1">
              {[snag.place, snag.words].filter(Boolean).join(': ')} ({words.menders[snag.mender]}
              {snag.dueOn ? `, ${words.dueOn(snag.dueOn)}` : ''})
            </li>
          ))}
        </ul>
      </div>
      <TextField
        label={words.signerName}
        value={name}
        maxLength={120}
        className="min-h-thumb"
        error={asks === 'name' && name.trim() === '' ? words.nameFirst : undefined}
        onChange={(event) => setName(event.target.value)}
      />
      <div className="flex flex-col gap-2">
        <div className="flex items-center justify-between">
          <p className="font-medium">{words.signHere}</p>
          <Button look="plain" size="thumb" className="w-auto!" onClick={clear}>
            {words.clear}
          </Button>
        </div>
        <SignPad label={words.signHere} isCleared={cleared} onChange={setStrokes} />
        {asks === 'sign' && strokes.length === 0 ? (
          <p role="alert" className="text-chalk">
            {words.signFirst}
          </p>
        ) : null}
      </div>
      <KeepFailed isFailed={isFailed} />
      <Button size="thumb" onClick={sign}>
        {words.signNow}
      </Button>
    </ScreenFrame>
  );
}

/** Signed is mostly the last thing here: they leave by one more tap, and stand before the next stop. */
function DoneHere({ visit }: { visit: TodayVisit }) {
  const { words } = useCrew();
  const { status, report, isFailed } = useReport(visit);
  if (status !== 'on-site') return null;
  const leave = async () => {
    if (await report('done')) goToStop({ at: 'stop' });
  };
  return (
    <>
      <KeepFailed isFailed={isFailed} />
      <Button size="thumb" onClick={leave}>
        {words.taps.done}
      </Button>
    </>
  );
}

/** What is signed is signed in the language that it was read in. */
function OtherLanguage({ current }: { current: CrewLanguage }) {
  const other = current === 'en' ? 'es' : 'en';
  return (
    <Button
      look="line"
      size="thumb"
      lang={other}
      className="w-auto! self-end"
      onClick={() => chooseLanguage(other)}
    >
      {crewWords[other].languageName}
    </Button>
  );
}
