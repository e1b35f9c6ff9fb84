import { randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, inject, it, vi } from 'vitest';
import type { JobRow, JobView, RoomRow } from '@/lib/contracts/jobs';
import type { CrewView, TodayView } from '@/lib/contracts/visits';
import { apiPaths, paths } from '@/lib/paths';
import { type Role, roles } from '@/lib/permissions';
import { addDays } from '@/lib/time/civil';
import { localDate } from '@/lib/time/local-moment';
import { askAt, getAt } from '../help/ask-at';
import { keepPicture, type Size, type Theme, useBrowser } from '../help/browser';
import { seriousFaults } from '../help/browser-faults';
import { settled } from '../help/settled';
import { sourceFiles } from '../help/source-files';

/** Addresses that are known only once the demo is there. */
type Known = {
  today: string;
  measured: { jobId: string; roomId: string };
  misread: { jobId: string; roomId: string };
  released: { jobId: string; roomId: string };
  visit: { id: string; jobId: string };
  install: { id: string };
  customerId: string;
  /** Under way for a while: nobody is told before the office may no longer take a booking back. */
  customerLink: Promise<string>;
};

type Screen = {
  name: string;
  path: (known: Known) => string | Promise<string>;
  /** What must be seen; its first heading where nothing is said. */
  shows?: RegExp;
  mayLog?: RegExp[];
};

const screens: Record<Role | 'nobody', Screen[]> = {
  nobody: [
    { name: 'front', path: paths.front },
    { name: 'check', path: paths.check },
    { name: 'sign-in', path: () => paths.signIn() },
    { name: 'sign-up', path: paths.signUp },
    { name: 'join-over', path: () => paths.join('not-an-invitation'), mayLog: [/status of 404/] },
    { name: 'nowhere', path: () => '/nowhere', mayLog: [/status of 404/] },
    { name: 'no-signal', path: () => '/no-signal' },
    { name: 'demo', path: paths.demo },
    { name: 'demo-inbox', path: paths.demoPhone },
    { name: 'customer', path: ({ customerLink }) => customerLink },
    { name: 'customer-times', path: async ({ customerLink }) => `${await customerLink}/times` },
  ],
  scheduler: [
    { name: 'diary', path: paths.diary, shows: /Waiting to be booked/ },
    { name: 'late', path: paths.slip },
    { name: 'days', path: paths.days },
    { name: 'day', path: ({ today }) => paths.day(addDays(today, 1)) },
    { name: 'jobs', path: paths.jobs },
    { name: 'job-new', path: paths.newJob },
    { name: 'jobs-import', path: paths.importJobs },
    { name: 'job', path: ({ measured }) => paths.job(measured.jobId) },
    { name: 'messages', path: paths.messages },
    { name: 'thread', path: ({ customerId }) => paths.thread(customerId) },
    { name: 'snags', path: paths.snags },
  ],
  owner: [
    { name: 'crews', path: paths.crews },
    { name: 'wordings', path: paths.wordings },
    { name: 'numbers', path: paths.numbers },
    { name: 'rules', path: paths.rules },
    { name: 'programs', path: paths.programs },
    { name: 'tools', path: paths.tools },
    { name: 'checklists', path: paths.checklists },
    { name: 'start', path: paths.start },
  ],
  bench: [
    { name: 'bench', path: paths.bench },
    { name: 'sheet', path: ({ released: r }) => paths.sheet(r.jobId, r.roomId, 'A') },
  ],
  measurer: [
    { name: 'fit', path: ({ measured: r }) => paths.room(r.jobId, r.roomId) },
    { name: 'fit-misread', path: ({ misread: r }) => paths.room(r.jobId, r.roomId) },
    { name: 'today', path: paths.today },
    { name: 'visit', path: ({ visit }) => paths.todayVisit(visit.id) },
    { name: 'walls-new', path: ({ visit }) => paths.newWalls(randomUUID(), visit.jobId) },
    {
      name: 'walls',
      path: ({ misread }) => `${paths.walls(misread.roomId)}#list`,
      shows: /Kitchen/,
    },
    {
      name: 'walls-leave',
      path: ({ misread }) => `${paths.walls(misread.roomId)}#leave`,
      shows: /Before you leave/,
    },
  ],
  crew: [
    { name: 'crew-today', path: paths.today },
    { name: 'install', path: ({ install }) => paths.todayVisit(install.id) },
  ],
};

const everyLook: { size: Size; theme: Theme }[] = [
  { size: 'desk', theme: 'light' },
  { size: 'phone', theme: 'dark' },
  // Told apart from these two by colour and width alone: looked at when a look is changed.
  { size: 'desk', theme: 'dark' },
  { size: 'phone', theme: 'light' },
];
/** The office is looked at on a phone with the other looks alone: it would cost each run a minute. */
const looks = process.env.EVERY_LOOK ? everyLook : everyLook.slice(0, 2);

let known: Known;

beforeAll(async () => {
  const as = (role: Role) => ({ baseUrl: inject('baseUrl'), cookie: inject('sessions')[role] });
  const jobs = await getAt<JobRow[]>(as('owner'), apiPaths.jobs());
  const jobOf = (customer: string) => {
    const job = jobs.find(({ customerName }) => customerName === customer);
    if (!job) throw new Error(`the demo has no ${customer}`);
    return job.id;
  };
  const roomOf = async (customer: string) => {
    const jobId = jobOf(customer);
    const [room] = await getAt<RoomRow[]>(as('owner'), `${apiPaths.rooms()}?jobId=${jobId}`);
    return { jobId, roomId: room?.id ?? '' };
  };
  const today = localDate(new Date(), 'America/New_York');
  /** The first day from today that has a visit of theirs: a weekend has none. */
  const firstVisit = async (role: Role) => {
    for (let ahead = 0; ahead < 14; ahead += 1) {
      const address = `${apiPaths.today()}?date=${addDays(today, ahead)}`;
      const [visit] = (await getAt<TodayView>(as(role), address)).visits;
      if (visit) return visit;
    }
    throw new Error(`the demo has no visit for the ${role}`);
  };
  const measured = await roomOf('Ruth Ember');
  known = {
    today,
    measured,
    misread: await roomOf('Piet Harrow'),
    released: await roomOf('Noor Vale'),
    visit: await firstVisit('measurer'),
    install: await firstVisit('crew'),
    customerId: (await getAt<JobView>(as('owner'), apiPaths.job(measured.jobId))).customerId,
    customerLink: mailedLink(
      await bookMeasure(as('scheduler'), jobOf('Hetty Crane'), addDays(today, 30)),
    ),
  };
});

/** Books a measure on the first day that takes one; gives the address that is written to, at any hour. */
async function bookMeasure(
  scheduler: { baseUrl: string; cookie: string },
  jobId: string,
  from: string,
): Promise<string> {
  const crews = await getAt<CrewView[]>(scheduler, apiPaths.crews());
  const crewId = crews.find(({ does }) => does === 'measure')?.id;
  const { email } = await getAt<{ email: string }>(scheduler, apiPaths.job(jobId));
  const place = { jobId, kind: 'site-measure', crewId, time: '09:00' };
  let status = 0;
  for (let ahead = 0; status !== 200 && ahead < 10; ahead += 1) {
    const body = { ...place, idempotencyKey: randomUUID(), date: addDays(from, ahead) };
    ({ status } = await askAt(scheduler, apiPaths.visits(), { body }));
  }
  expect(status).toBe(200);
  return email;
}

function mailedLink(address: string): Promise<string> {
  return vi.waitFor(
    async () => {
      const inbox = await fetch(inject('baseUrl') + paths.demoPhoneOf({ address }));
      const link = (await inbox.text()).match(/href="(https?:[^"]*\/v\/[^"]+)"/)?.[1];
      if (!link) throw new Error('no link has arrived yet');
      return link;
    },
    { timeout: 40_000, interval: 500 },
  );
}

/** Two minutes that each run need not wait for: `npm run test:screens`, when a page or the look has changed. */
const isAsked = Boolean(process.env.EVERY_SCREEN);

describe.runIf(isAsked).each(looks)('at the $size, $theme', ({ size, theme }) => {
  const browser = useBrowser();
  // The e-mail to the customer takes a while, so whoever comes by link comes last.
  const everybody = [...roles, 'nobody'] as const;
  const onPhones = ['crew', 'nobody'] as const;

  it.each(size === 'phone' && !process.env.EVERY_LOOK ? onPhones : everybody)(
    'no screen of %s has a serious fault or scrolls sideways',
    async (who) => {
      const mayLog = screens[who].flatMap((screen) => screen.mayLog ?? []);
      const as = who === 'nobody' ? undefined : who;
      const page = await browser.openPage({ size, theme, as, mayLog });
      const faults = [];
      for (const { name, path, shows } of screens[who]) {
        await page.goto(await path(known));
        const heading = page.getByRole('heading', shows ? { name: shows } : { level: 1 });
        await heading.first().waitFor();
        await settled(page);
        await keepPicture(page, name, theme);
        faults.push(...(await seriousFaults(page)));
      }
      expect(faults).toEqual([]);
    },
  );
});

it.runIf(isAsked)('no page is left out of the list', async () => {
  const addresses = await Promise.all(
    Object.values(screens).flatMap((list) => list.map(({ path }) => path(known))),
  );
  const seen = addresses.map((address) => new URL(address, inject('baseUrl')).pathname);
  expect(pagePatterns().filter(([, pattern]) => !seen.some((path) => pattern.test(path)))).toEqual(
    [],
  );
});

/** Each page of the program with the addresses that it answers. */
function pagePatterns(): [string, RegExp][] {
  return sourceFiles('app')
    .filter(({ file }) => file.endsWith('/page.tsx'))
    .map(({ file }) => {
      const parts = file.split('/').slice(1, -1);
      const shown = parts.filter((part) => !part.startsWith('('));
      const words = shown.map((part) => (part.startsWith('[') ? '[^/]+' : part));
      return [file, new RegExp(`^/${words.join('/')}$`)];
    });
}
