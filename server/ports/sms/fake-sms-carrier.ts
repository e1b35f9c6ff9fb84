/** The carrier behind the fake provider: takes texts in, delivers and reports them, brings answers back. */
import { randomBytes } from 'node:crypto';
import { type FakeAccount, inboundParams, postSigned, statusParams } from './fake-sms-posts';
import type { FakeSmsStore, FakeText } from './fake-sms-store';

/** One step of a delivery: what is reported, and how long after the step before. */
export type ReportStep = { status: string; errorCode?: number; afterMs: number };

/** Words by which a number opts out and in at the provider: alone in the text, in any case. */
const optOutWords = new Set([
  'STOP',
  'STOPALL',
  'UNSUBSCRIBE',
  'CANCEL',
  'END',
  'QUIT',
  'REVOKE',
  'OPTOUT',
]);
const optInWords = new Set(['START', 'YES', 'UNSTOP']);

/** Said by the provider itself, once each. */
const optOutAnswer =
  'You will get no more messages from this number. Reply START to get them again.';
const optInAnswer = 'You will get messages from this number again.';

const finalStates = new Set(['delivered', 'undelivered', 'failed', 'canceled']);

export type FakeCarrier = ReturnType<typeof fakeCarrier>;

export function fakeCarrier(options: {
  store: FakeSmsStore;
  account: FakeAccount;
  /** Where texts from customers are posted. */
  inboundUrl: string;
  reportAfterMs: number;
}) {
  const { store, account, inboundUrl, reportAfterMs } = options;
  const timers = new Set<NodeJS.Timeout>();
  const underWay = new Set<Promise<unknown>>();
  let isStopped = false;

  const usualSteps: ReportStep[] = [
    { status: 'sent', afterMs: reportAfterMs },
    { status: 'delivered', afterMs: reportAfterMs },
  ];

  /** Delivers in the background; ends early when the fake stops. */
  function deliver(text: FakeText, steps: ReportStep[] = usualSteps): void {
    const delivery = deliverStepByStep(text, steps).finally(() => underWay.delete(delivery));
    underWay.add(delivery);
  }

  async function deliverStepByStep(text: FakeText, steps: ReportStep[]): Promise<void> {
    for (const { status, errorCode = null, afterMs } of steps) {
      await pause(afterMs);
      if (isStopped) return;
      await store.setStatus(text.sid, status, errorCode);
      if (!text.statusCallback) continue;
      await postSigned(
        account,
        text.statusCallback,
        statusParams(account, text, status, errorCode),
      );
    }
  }

  function pause(afterMs: number): Promise<void> {
    return new Promise((resolve) => {
      const timer = setTimeout(() => {
        timers.delete(timer);
        resolve();
      }, afterMs);
      timers.add(timer);
    });
  }

  /** A customer writes. Gives what our webhook answered, null when it was not there. */
  async function inbound(sms: { from: string; body: string }): Promise<number | null> {
    const word = sms.body.trim().toUpperCase();
    const isOut = optOutWords.has(word);
    const isIn = optInWords.has(word) && store.hasOptedOut(sms.from);
    const text = newText({ ...sms, direction: 'inbound', to: account.number, status: 'received' });
    await store.addText(text);
    if (isOut || isIn) {
      const isNew = store.hasOptedOut(sms.from) !== isOut;
      await store.setChoice(sms.from, isOut);
      if (isNew) await answerByItself(sms.from, isOut ? optOutAnswer : optInAnswer);
    }
    const optOutType = isOut ? 'STOP' : isIn ? 'START' : null;
    return postSigned(account, inboundUrl, inboundParams(account, text, optOutType));
  }

  function answerByItself(to: string, body: string): Promise<void> {
    return store.addText(
      newText({ direction: 'outbound-reply', from: account.number, to, body, status: 'delivered' }),
    );
  }

  /** A provider that was restarted goes on with what it had taken in. */
  function goOn(): void {
    for (const text of store.all()) {
      if (text.direction === 'outbound-api' && !finalStates.has(text.status)) deliver(text);
    }
  }

  return {
    usualSteps,
    deliver,
    inbound,
    goOn,
    /** Resolves when nothing is on its way. */
    async idle(): Promise<void> {
      while (underWay.size > 0) await Promise.all(underWay);
    },
    stop(): void {
      isStopped = true;
      for (const timer of timers) clearTimeout(timer);
    },
  };
}

export function newText(
  text: Pick<FakeText, 'direction' | 'from' | 'to' | 'body' | 'status'> & {
    statusCallback?: string | null;
  },
): FakeText {
  return {
    sid: `SM${randomBytes(16).toString('hex')}`,
    errorCode: null,
    createdAt: new Date().toISOString(),
    ...text,
    statusCallback: text.statusCallback ?? null,
  };
}
