'use client';

import { useRouter } from 'next/navigation';
import { type FormEvent, useState } from 'react';
import { problemOf } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/text-field';
import { showToast } from '@/components/ui/toast-store';
import type { BenchSheet } from '@/lib/contracts/bench';
import { sendReady } from './bench-query';

type Asked = 'now' | 'later' | null;

/** Ready now, and where they stand; or on which day, and why not sooner. */
export function ReadyForm({ sheet }: { sheet: BenchSheet }) {
  const router = useRouter();
  const [asked, setAsked] = useState<Asked>(null);
  const [isBusy, setIsBusy] = useState(false);
  const [day, setDay] = useState(sheet.readyOn ?? sheet.needOn ?? '');
  const [words, setWords] = useState('');

  const say = async (readyOn: string | null, said: { where?: string; why?: string }) => {
    setIsBusy(true);
    try {
      await sendReady(sheet.jobId, { readyOn, ...said });
      showToast({ text: readyOn ? 'Said. The waiting list knows.' : 'Taken back.' });
      setAsked(null);
      router.refresh();
    } catch (caught) {
      showToast({ text: problemOf(caught).title, isProblem: true });
    } finally {
      setIsBusy(false);
    }
  };
  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (asked === 'now') return void say(sheet.today, { where: words.trim() });
    if (day) void say(day, { why: words.trim() });
  };

  if (sheet.isReady) {
    return (
      <Button size="thumb" look="plain" onClick={() => void say(null, {})}>
        Not ready after all
      </Button>
    );
  }
  if (asked === null) {
    return (
      <div className="grid grid-cols-2 gap-2">
        <Button size="thumb" look="line" onClick={() => setAsked('now')}>
          Ready
        </Button>
        <Button size="thumb" look="line" onClick={() => setAsked('later')}>
          Ready on …
        </Button>
      </div>
    );
  }
  return (
    <form onSubmit={submit} className="flex flex-col gap-3 text-body">
      {asked === 'later' ? (
        <TextField
          label="Ready on"
          type="date"
          required
          value={day}
          className="min-h-thumb"
          onChange={(event) => setDay(event.target.value)}
        />
      ) : null}
      <TextField
        label={asked === 'now' ? 'Where they stand' : 'Why late or short'}
        isOptional
        value={words}
        maxLength={asked === 'now' ? 120 : 400}
        className="min-h-thumb"
        onChange={(event) => setWords(event.target.value)}
      />
      <div className="grid grid-cols-2 gap-2">
        <Button type="submit" size="thumb" busyText={isBusy ? 'Saying…' : undefined}>
          {asked === 'now' ? 'They are ready' : 'Say it'}
        </Button>
        <Button size="thumb" look="plain" onClick={() => setAsked(null)}>
          Back
        </Button>
      </div>
    </form>
  );
}
