import { randomUUID } from 'node:crypto';
import { type AnyColumn, and, asc, eq, lt } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import { jobs, visitPiecePeople, visitPieces, visits } from '@/db/schema';
import type { PersonContext } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';
import { makeCrew } from '../make-crew';
import { contextOf, makeShop, type TestShop } from '../make-shop';
import { startTestJob } from '../start-test-job';

/** A shop with crews that share people, and the clock that all its actors go by. */
export type DiaryWorld = {
  shop: TestShop;
  crewIds: string[];
  jobIds: string[];
  nowMs: number;
  /** The highest version seen of each visit. */
  versions: Map<string, number>;
  refused: number;
  done: number;
};

export type Actor = 'owner' | 'scheduler';

/** Tuesday 2026-12-01, ten in the morning in New York. */
const startMs = Date.parse('2026-12-01T15:00:00Z');

export async function makeDiaryWorld(): Promise<DiaryWorld> {
  const shop = await makeShop();
  const { measurer, owner, crew } = shop.people;
  const crewsOf = [
    [measurer.personId],
    [measurer.personId, owner.personId],
    [owner.personId, crew.personId],
  ];
  const crewIds: string[] = [];
  for (const people of crewsOf) crewIds.push((await makeCrew(shop, 'measure', people)).crewId);
  const jobIds: string[] = [];
  for (let count = 0; count < 4; count += 1) jobIds.push((await startTestJob(shop)).jobId);
  return { shop, crewIds, jobIds, nowMs: startMs, versions: new Map(), refused: 0, done: 0 };
}

export async function contextIn(world: DiaryWorld, actor: Actor): Promise<PersonContext> {
  return contextOf(world.shop, actor, new Date(world.nowMs));
}

/** All of the diary that a refusal must leave as it was. */
export async function diaryOf(world: DiaryWorld) {
  const { db } = await contextIn(world, 'owner');
  const shopId = world.shop.shop.id;
  const visitRows = await db
    .select()
    .from(visits)
    .where(eq(visits.shopId, shopId))
    .orderBy(asc(visits.id));
  const pieceRows = await db
    .select({ visitId: visitPieces.visitId, from: visitPieces.startsAt, until: visitPieces.endsAt })
    .from(visitPieces)
    .where(eq(visitPieces.shopId, shopId))
    .orderBy(asc(visitPieces.startsAt), asc(visitPieces.visitId));
  const stages = await db
    .select({ id: jobs.id, stage: jobs.stage })
    .from(jobs)
    .where(eq(jobs.shopId, shopId))
    .orderBy(asc(jobs.id));
  return { visitRows, pieceRows, stages };
}

/** Does something that may be refused; a refusal has to leave the diary as it was. */
export async function attempt(world: DiaryWorld, work: () => Promise<unknown>): Promise<void> {
  const before = await diaryOf(world);
  try {
    await work();
    world.done += 1;
  } catch (error) {
    if (!(error instanceof Refusal)) throw error;
    world.refused += 1;
    const after = await diaryOf(world);
    if (JSON.stringify(after) !== JSON.stringify(before)) {
      throw new Error(`a refusal (${error.refusal.code}) changed the diary`);
    }
  }
  await checkDiary(world);
}

/** Nobody in two places, pieces of the visits that stand alone, versions that only rise. */
export async function checkDiary(world: DiaryWorld): Promise<void> {
  const { db } = await contextIn(world, 'owner');
  const shopId = world.shop.shop.id;
  const crewPiece = alias(visitPieces, 'crew_piece');
  const ofCrew = await db
    .select({ id: visitPieces.id })
    .from(visitPieces)
    .innerJoin(
      crewPiece,
      overlapping(visitPieces, crewPiece, [visitPieces.crewId, crewPiece.crewId]),
    )
    .where(eq(visitPieces.shopId, shopId));
  const personPiece = alias(visitPiecePeople, 'person_piece');
  const ofPerson = await db
    .select({ id: visitPiecePeople.id })
    .from(visitPiecePeople)
    .innerJoin(
      personPiece,
      overlapping(visitPiecePeople, personPiece, [visitPiecePeople.personId, personPiece.personId]),
    )
    .where(eq(visitPiecePeople.shopId, shopId));
  if (ofCrew.length + ofPerson.length > 0) throw new Error('somebody is in two places at once');
  const { visitRows, pieceRows } = await diaryOf(world);
  const withPieces = new Set(pieceRows.map(({ visitId }) => visitId));
  for (const { id, status, version } of visitRows) {
    if (version < (world.versions.get(id) ?? 0)) throw new Error('a version fell');
    world.versions.set(id, version);
    if (withPieces.has(id) === (status === 'called-off')) {
      throw new Error(`a visit that is ${status} has ${withPieces.has(id) ? '' : 'no '}pieces`);
    }
  }
}

type Busy = Record<'id' | 'startsAt' | 'endsAt', AnyColumn>;

function overlapping(one: Busy, other: Busy, [whose, othersWhose]: [AnyColumn, AnyColumn]) {
  return and(
    eq(whose, othersWhose),
    lt(one.id, other.id),
    lt(one.startsAt, other.endsAt),
    lt(other.startsAt, one.endsAt),
  );
}

export async function visitsIn(world: DiaryWorld) {
  const { visitRows } = await diaryOf(world);
  return visitRows;
}

export const newKey = (): string => randomUUID();
