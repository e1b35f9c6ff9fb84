/** What the fake provider knows: texts in both directions, and who said STOP. */
import { openAppendLog } from '@/server/ports/fakes/append-log';

export type FakeText = {
  sid: string;
  /** outbound-reply: the provider's own answer to STOP and START. */
  direction: 'outbound-api' | 'outbound-reply' | 'inbound';
  from: string;
  to: string;
  body: string;
  status: string;
  errorCode: number | null;
  /** ISO, UTC. */
  createdAt: string;
  statusCallback: string | null;
};

type Entry =
  | { is: 'text'; text: FakeText }
  | { is: 'status'; sid: string; status: string; errorCode: number | null }
  | { is: 'choice'; number: string; isOptedOut: boolean };

export type FakeSmsStore = Awaited<ReturnType<typeof openFakeSmsStore>>;

export async function openFakeSmsStore(file: string) {
  const texts = new Map<string, FakeText>();
  const optedOut = new Set<string>();
  const log = await openAppendLog<Entry>(file);
  for (const entry of log.entries) apply(entry);

  function apply(entry: Entry): void {
    if (entry.is === 'text') texts.set(entry.text.sid, entry.text);
    else if (entry.is === 'choice') {
      if (entry.isOptedOut) optedOut.add(entry.number);
      else optedOut.delete(entry.number);
    } else {
      const text = texts.get(entry.sid);
      if (text) texts.set(text.sid, { ...text, status: entry.status, errorCode: entry.errorCode });
    }
  }

  function write(entry: Entry): Promise<void> {
    apply(entry);
    return log.append(entry);
  }

  return {
    addText: (text: FakeText) => write({ is: 'text', text }),
    setStatus: (sid: string, status: string, errorCode: number | null) =>
      write({ is: 'status', sid, status, errorCode }),
    setChoice: (number: string, isOptedOut: boolean) => write({ is: 'choice', number, isOptedOut }),
    hasOptedOut: (number: string) => optedOut.has(number),
    text: (sid: string): FakeText | null => texts.get(sid) ?? null,
    /** Oldest first. */
    all: (): FakeText[] => [...texts.values()],
  };
}
