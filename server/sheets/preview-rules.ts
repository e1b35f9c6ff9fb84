import { and, desc, eq, isNotNull, notInArray, sql } from 'drizzle-orm';
import { jobs, releases, rooms } from '@/db/schema';
import type { RulePreview } from '@/lib/contracts/rule-changes';
import type { ChangeShopRulesInput, FitRules } from '@/lib/contracts/shop-rules';
import { fitRoom } from '@/lib/measure/fit-room';
import { ruleChanges } from '@/lib/rules/rule-changes';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { checkedRules } from '@/server/shops/checked-rules';
import { readWallBook } from '@/server/walls/read-wall-book';

/** The newest rooms show what a change does; more would keep the owner waiting. */
const mostRooms = 12;

/** What a change of the rules would do; nothing is changed. */
export async function previewRules(
  ctx: PersonContext,
  asked: ChangeShopRulesInput,
): Promise<RulePreview> {
  mustBeAllowed(ctx, 'shop:change');
  const input = checkedRules(ctx, asked);
  const { name, phone, email, zone, rules } = ctx.shop;
  const changes = ruleChanges({ name, phone, email, zone, ...rules }, input);
  const [released] = await ctx.db
    .select({ n: sql<number>`count(*)::int` })
    .from(releases)
    .where(eq(releases.shopId, ctx.shop.id));
  const looked = input.fit ? await lookAtRooms(ctx, input.fit) : { rooms: [], roomsLookedAt: 0 };
  return { changes, ...looked, releasedSheets: released?.n ?? 0 };
}

async function lookAtRooms(
  ctx: PersonContext,
  next: FitRules,
): Promise<Pick<RulePreview, 'rooms' | 'roomsLookedAt'>> {
  const unreleased = await ctx.db
    .select({ roomId: rooms.id, name: rooms.name, jobId: rooms.jobId, jobNumber: jobs.number })
    .from(rooms)
    .innerJoin(jobs, eq(jobs.id, rooms.jobId))
    .where(
      and(
        eq(rooms.shopId, ctx.shop.id),
        isNotNull(rooms.submittedAt),
        notInArray(
          rooms.id,
          ctx.db
            .select({ id: releases.roomId })
            .from(releases)
            .where(eq(releases.shopId, ctx.shop.id)),
        ),
      ),
    )
    .orderBy(desc(rooms.submittedAt))
    .limit(mostRooms);
  const changed: RulePreview['rooms'] = [];
  for (const { roomId, jobId, jobNumber, name } of unreleased) {
    const { wallBook, runs } = await readWallBook(ctx.db, ctx, roomId);
    const outcome = (rules: FitRules) => outcomeWords(fitRoom(wallBook, runs, rules));
    const [from, to] = [outcome(ctx.shop.rules.fit), outcome(next)];
    if (from !== to) changed.push({ jobId, roomId, words: `Job ${jobNumber}, ${name}`, from, to });
  }
  return { rooms: changed, roomsLookedAt: unreleased.length };
}

function outcomeWords({ verdicts, runs }: ReturnType<typeof fitRoom>): string {
  const count = (share: string) => verdicts.filter(({ verdict }) => verdict === share).length;
  const fills = runs.map(({ name, fill }) => `${name} ${fill?.verdict ?? 'not known'}`);
  return [`${count('over')} over`, `${count('close')} close`, ...fills].join(', ');
}
