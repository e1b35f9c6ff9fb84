/**
 * A texting provider on loopback. It speaks the provider's own API, so that the SDK itself is used; it
 * delivers, reports and signs as the provider does, and keeps what it received in a file.
 */
import { createServer } from 'node:http';
import { faultSwitch } from '@/server/ports/fakes/fault-switch';
import { LOOPBACK, listenOnLoopback, trackSockets } from '@/server/ports/fakes/listening';
import { fakeSmsApi, type SmsFault } from './fake-sms-api';
import { fakeCarrier } from './fake-sms-carrier';
import type { FakeAccount } from './fake-sms-posts';
import { type FakeText, openFakeSmsStore } from './fake-sms-store';

export type FakeSms = Awaited<ReturnType<typeof startFakeSms>>;

export type FakeSmsOptions = {
  account: FakeAccount;
  /** JSON lines; made when it is not there. */
  file: string;
  /** Our webhook for texts from customers. */
  inboundUrl: string;
  /** 0, the default, takes any free port. */
  port?: number;
  /** Time from taken to sent, and from sent to delivered. */
  reportAfterMs?: number;
};

export async function startFakeSms(options: FakeSmsOptions) {
  const { account, file, inboundUrl, port = 0, reportAfterMs = 300 } = options;
  const store = await openFakeSmsStore(file);
  const faults = faultSwitch<SmsFault>();
  const carrier = fakeCarrier({ store, account, inboundUrl, reportAfterMs });
  const answer = fakeSmsApi({ account, store, carrier, faults });
  const server = createServer((request, response) => {
    answer(request, response).catch(() => request.socket.destroy());
  });
  const sockets = trackSockets(server);
  const apiBaseUrl = `http://${LOOPBACK}:${await listenOnLoopback(server, port)}`;
  carrier.goOn();

  return {
    account,
    apiBaseUrl,
    faults,
    /** Everything to and from a number, oldest first: what its phone shows. */
    messagesFor: (number: string): FakeText[] =>
      store.all().filter((text) => text.to === number || text.from === number),
    /** Every number that was texted or wrote, the one with the newest text first. */
    numbers(): string[] {
      const others = store
        .all()
        .map((text) => (text.direction === 'inbound' ? text.from : text.to));
      return [...new Set(others.reverse())];
    },
    hasOptedOut: store.hasOptedOut,
    inbound: carrier.inbound,
    idle: carrier.idle,
    async stop(): Promise<void> {
      carrier.stop();
      sockets.dropAll();
      await new Promise((resolve) => server.close(resolve));
    },
  };
}
