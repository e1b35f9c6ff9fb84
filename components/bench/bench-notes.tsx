'use client';

import { useRouter } from 'next/navigation';
import { type FormEvent, useState } from 'react';
import { PhotoImage } from '@/components/photos/photo-image';
import { problemOf } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/text-field';
import { TitleBlock } from '@/components/ui/title-block';
import { showToast } from '@/components/ui/toast-store';
import { Verdict } from '@/components/ui/verdict';
import type { SnagView } from '@/lib/contracts/snags';
import { apiPaths } from '@/lib/paths';
import { crewEn } from '@/lib/words/crew-en';
import { sendAnswer } from './bench-query';

/** Notes from site: parts short, damaged or wrong, with their photos, until they are mended there. */
export function BenchNotes({ notes, mayAnswer }: { notes: SnagView[]; mayAnswer: boolean }) {
  if (notes.length === 0) return null;
  return (
    <section>
      <TitleBlock title="Notes from site" meta={notes.length} />
      <ul className="divide-y divide-rule border-b border-rule">
        {notes.map((note) => (
          <li
            key={note.id}
            className="grid gap-3 py-4 lg:grid-cols-[minmax(0,1fr)_minmax(0,24rem)]"
          >
            <div>
              <p className="leading-tight font-bold">
                {crewEn.snagKinds[note.kind]}: {note.words}
              </p>
              <p className="text-body text-graphite">
                {[note.roomName, note.place].filter(Boolean).join(', ')}
              </p>
              <p className="text-body text-graphite">
                {note.customerName}, job {note.jobNumber} · {note.foundWords}
              </p>
              {note.dueWords ? (
                <Verdict kind={note.isLate ? 'late' : 'waiting'}>by {note.dueWords}</Verdict>
              ) : null}
              <Photos note={note} />
            </div>
            <div>
              {note.benchSays ? (
                <p className="border-l-4 border-moss bg-tint px-3 py-2">
                  {note.benchSays}
                  {note.benchReadyOn ? `, ready ${note.benchReadyOn}` : ''}
                </p>
              ) : null}
              {mayAnswer ? <Answer note={note} /> : null}
            </div>
          </li>
        ))}
      </ul>
    </section>
  );
}

function Photos({ note }: { note: SnagView }) {
  if (note.photoIds.length === 0) return null;
  return (
    <ul className="flex gap-2 overflow-x-auto py-2">
      {note.photoIds.map((photoId) => (
        <li key={photoId}>
          <a
            href={apiPaths.file(photoId)}
            target="_blank"
            rel="noreferrer"
            className="block size-28 overflow-hidden rounded border border-rule bg-tint"
          >
            <PhotoImage src={apiPaths.file(photoId)} words={`Photo: ${note.words}`} />
          </a>
        </li>
      ))}
    </ul>
  );
}

function Answer({ note }: { note: SnagView }) {
  const router = useRouter();
  const [isAsked, setIsAsked] = useState(false);
  const [isBusy, setIsBusy] = useState(false);
  const [words, setWords] = useState(note.benchSays);
  const [readyOn, setReadyOn] = useState(note.benchReadyOn ?? '');
  if (!isAsked) {
    return (
      <Button size="thumb" look="line" className="mt-2" onClick={() => setIsAsked(true)}>
        {note.benchSays ? 'Change the answer' : 'Answer'}
      </Button>
    );
  }
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    setIsBusy(true);
    try {
      await sendAnswer(note.id, { words: words.trim(), readyOn: readyOn || null });
      setIsAsked(false);
      router.refresh();
    } catch (caught) {
      showToast({ text: problemOf(caught).title, isProblem: true });
    } finally {
      setIsBusy(false);
    }
  };
  return (
    <form onSubmit={submit} className="mt-2 flex flex-col gap-3 text-body">
      <TextField
        label="What the bench does"
        required
        value={words}
        maxLength={400}
        className="min-h-thumb"
        onChange={(event) => setWords(event.target.value)}
      />
      <TextField
        label="Ready on"
        type="date"
        isOptional
        value={readyOn}
        className="min-h-thumb"
        onChange={(event) => setReadyOn(event.target.value)}
      />
      <Button type="submit" size="thumb" busyText={isBusy ? 'Saying…' : undefined}>
        Say it
      </Button>
    </form>
  );
}
