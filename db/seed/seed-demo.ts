import { randomUUID } from 'node:crypto';
import { sql } from 'drizzle-orm';
import type { Database, Transaction } from '@/db/database';
import { crewPeople, crews, people, shops, tools } from '@/db/schema';
import type { Tool } from '@/lib/contracts/wall-book';
import { addressPlace, towns } from '@/lib/island/demo-island';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { demoJobs } from './demo-jobs';
import { seedJob } from './seed-job';
import { seedMessages } from './seed-messages';
import { seedSignIn } from './seed-sign-in';
import type { DemoSignature } from './seed-sign-off';
import { seededRandom } from './seeded-random';
import { type CrewKey, crewsOfTheShop, juniperBend, type StaffKey, staff } from './staff';

export type SeedOptions = {
  now: Date;
  /** The sign-in library's own, so that the demo's password opens the door. */
  hashPassword: (password: string) => Promise<string>;
  /** The customer's link of a visit: its token needs the signing secret. */
  linkVisit: LinkVisit;
  /** What a customer signed, kept by the program's own verb: its seal needs the signing secret. */
  signOff: KeepSignOff;
};

type KeepSignOff = (tx: Transaction, signature: DemoSignature) => Promise<void>;
type LinkVisit = (
  tx: Transaction,
  visit: { shopId: string; visitId: string; endsAt: Date },
) => Promise<void>;

/** Makes the invented shop, and a second one to prove the walls between them; does nothing where a shop is. */
export async function seedDemo(db: Database, options: SeedOptions): Promise<void> {
  const { now, hashPassword } = options;
  const [kept] = await db.select({ count: sql<number>`count(*)::int` }).from(shops);
  if (kept && kept.count > 0) return;
  const passwordHash = await hashPassword('setwell-demo');
  await db.transaction(async (tx) => {
    await seedJuniperBend(tx, options, passwordHash);
    await seedSecondShop(tx, now, passwordHash);
  });
}

/** What a job of the demo needs to know of its shop. */
export type SeedShop = {
  id: string;
  zone: string;
  rules: ReturnType<typeof defaultShopRules>;
  staff: Record<StaffKey, string>;
  crews: Record<CrewKey, { id: string; personIds: string[] }>;
  tools: { tape: Tool; level: Tool };
  now: Date;
  name: string;
  linkVisit: LinkVisit;
  signOff: KeepSignOff;
  random: () => number;
};

async function seedJuniperBend(tx: Transaction, options: SeedOptions, passwordHash: string) {
  const rules = defaultShopRules('US');
  const shop = { ...juniperBend, id: randomUUID(), region: 'US' as const, rules };
  await seedWorkingShop(tx, shop, options, (shopId) => seedStaff(tx, shopId, passwordHash));
}

/** A shop in the middle of its work: crews, tools, some forty jobs, what was told and answered. */
export async function seedWorkingShop(
  tx: Transaction,
  row: Omit<typeof shops.$inferInsert, 'nextJobNumber'>,
  { now, linkVisit, signOff }: Omit<SeedOptions, 'hashPassword'>,
  seedPeople: (shopId: string) => Promise<Record<StaffKey, string>>,
): Promise<void> {
  const { id, zone } = row;
  const rules = { ...row.rules, booking: { ...row.rules.booking, dayStart: '07:30' } };
  await tx.insert(shops).values({ ...row, rules, nextJobNumber: 2401 + demoJobs.length });
  const shop: SeedShop = {
    id,
    zone,
    rules,
    now,
    name: row.name,
    linkVisit,
    signOff,
    random: seededRandom(20_26),
    staff: await seedPeople(id),
    crews: {} as SeedShop['crews'],
    tools: await seedTools(tx, id, rules.fit.stepMm),
  };
  shop.crews = await seedCrews(tx, shop);
  for (const [index, job] of demoJobs.entries()) {
    await seedJob(tx, shop, {
      job,
      number: 2401 + index,
      place: addressPlace(job.street, job.house),
    });
  }
  await seedMessages(tx, shop);
}

async function seedStaff(tx: Transaction, shopId: string, passwordHash: string) {
  const ids: Partial<Record<StaffKey, string>> = {};
  for (const [key, { name, role, email }] of Object.entries(staff)) {
    const userId = email ? await seedSignIn(tx, { name, email, passwordHash }) : null;
    const id = randomUUID();
    await tx.insert(people).values({ id, shopId, userId, name, role });
    ids[key as StaffKey] = id;
  }
  return ids as Record<StaffKey, string>;
}

async function seedCrews(tx: Transaction, shop: SeedShop): Promise<SeedShop['crews']> {
  const made: Partial<SeedShop['crews']> = {};
  const base = towns['Juniper Bend'];
  for (const { key, name, does, colour, people: members } of crewsOfTheShop) {
    const id = randomUUID();
    const personIds = members.map((member) => shop.staff[member]);
    await tx.insert(crews).values({
      id,
      shopId: shop.id,
      name,
      does,
      colour,
      baseAddress: 'Juniper Bend, at the shop',
      baseLatitude: base.latitude,
      baseLongitude: base.longitude,
    });
    await tx
      .insert(crewPeople)
      .values(personIds.map((personId) => ({ shopId: shop.id, crewId: id, personId })));
    made[key] = { id, personIds };
  }
  return made as SeedShop['crews'];
}

async function seedTools(tx: Transaction, shopId: string, stepMm: number) {
  const tape: Tool = {
    id: randomUUID(),
    name: 'Tape, class II',
    spec: { kind: 'tape', accuracyClass: 'II', stepMm, repeatabilityMm: 0.3 },
  };
  const level: Tool = {
    id: randomUUID(),
    name: 'Laser line and rule',
    spec: { kind: 'level', mpeMmPerM: 0.3, stepMm: 0.5, repeatabilityMm: 0.3 },
  };
  const laser: Tool = {
    id: randomUUID(),
    name: 'Laser meter',
    spec: { kind: 'laser', mpeMm: 1.5, stepMm: 1, repeatabilityMm: 0.3 },
  };
  await tx.insert(tools).values([tape, level, laser].map((tool) => ({ shopId, ...tool })));
  return { tape, level };
}

/** A small shop across the water: nobody of Juniper Bend may ever see it. */
async function seedSecondShop(tx: Transaction, now: Date, passwordHash: string) {
  const id = randomUUID();
  const rules = defaultShopRules('UK');
  await tx.insert(shops).values({
    id,
    name: 'Far Shore Joinery',
    phone: '+442079460142',
    email: 'office@farshore.example',
    zone: 'Europe/London',
    region: 'UK',
    rules,
    createdAt: now,
  });
  const userId = await seedSignIn(tx, {
    name: 'Alder Firth',
    email: 'owner@farshore.example',
    passwordHash,
  });
  await tx.insert(people).values({ shopId: id, userId, name: 'Alder Firth', role: 'owner' });
  await seedTools(tx, id, rules.fit.stepMm);
}
