import type { NumbersInput, NumbersView } from '@/lib/contracts/numbers';
import { confirmedBefore, inTheWindow } from '@/lib/numbers/promises';
import { secondTrips, shortFills } from '@/lib/numbers/second-trips';
import { daysUntil, drivePerVisit, hoursAgainstEstimate, messageCost } from '@/lib/numbers/times';
import { addDays } from '@/lib/time/civil';
import { fromLocal, localDate } from '@/lib/time/local-moment';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { readDriveFacts } from './read-drive-facts';
import {
  readFirstVisits,
  readMeasuredBefore,
  readMessageFacts,
  readSegmentPrice,
  readShortReleases,
  readSnagFacts,
} from './read-job-facts';
import { readVisitFacts } from './read-visit-facts';

/** The figures of the last so many days, up to now, each with the jobs that it is made of. */
export async function getNumbers(ctx: PersonContext, { days }: NumbersInput): Promise<NumbersView> {
  mustBeAllowed(ctx, 'numbers:read');
  const { zone } = ctx.shop;
  const today = localDate(ctx.now, zone);
  const firstDay = addDays(today, -days);
  const period = { from: fromLocal(firstDay, '00:00', zone), until: ctx.now };
  const visits = await readVisitFacts(ctx, period);
  const snags = await readSnagFacts(ctx, period.until);
  const drive = await readDriveFacts(ctx, period);
  const { segmentPrice, currency } = await readSegmentPrice(ctx);
  const snagsOfPeriod = snags.filter(({ foundAt }) => foundAt >= period.from);
  return {
    from: firstDay,
    until: today,
    currency,
    figures: [
      secondTrips(
        visits,
        { measuredBefore: await readMeasuredBefore(ctx, period.from), snags },
        zone,
      ),
      shortFills({ snags: snagsOfPeriod, releases: await readShortReleases(ctx, period) }, zone),
      daysUntil('days-to-measure', await readFirstVisits(ctx, 'site-measure', period), zone),
      daysUntil('days-to-install', await readFirstVisits(ctx, 'install', period), zone),
      confirmedBefore(visits, zone),
      inTheWindow(visits, zone),
      hoursAgainstEstimate(visits, zone),
      drivePerVisit(drive.days, drive.isEstimated),
      messageCost(await readMessageFacts(ctx, period), segmentPrice, zone),
    ],
  };
}
