import { type Occasion, parseOccasion } from '@/lib/messages/occasions';
import { type RenderInput, renderEmail, renderSms } from '@/lib/messages/render-message';
import type { TextLocale } from '@/lib/time/text-locale';
import type { Context, SystemActor } from '@/server/base/context';
import type { Compose, Composed, LeftOut } from '@/server/messages/compose';
import { readMessageSettings } from '@/server/messages/message-settings';
import { readOwnWording } from '@/server/messages/read-wording';
import type { Attachment } from '@/server/ports/email/email-port';
import { choiceWords, valuesOf } from './message-values';
import { calendarFiles, type Moved, movesWords, readOthers, toldWindow } from './moves-together';
import { type CustomerVisit, readCustomerVisit } from './read-customer-visit';
import { type CalendarMethod, visitCalendar } from './visit-calendar';
import { visitLinkAddress } from './visit-link';
import { whoComes } from './visit-people';

/** What was signed at the end of a visit, as a file; null where nothing was. Known to a room above. */
export type SignedCopyOf = (
  ctx: Context<SystemActor>,
  visitId: string,
) => Promise<Attachment | null>;

/** Messages about visits without a copy of what was signed. */
export const composeVisitMessage = composeWithCopy(async () => null);

/** Writes a message about a visit from the visit as it is now; or says why it is not sent after all. */
export function composeWithCopy(signedCopyOf: SignedCopyOf): Compose {
  return async (ctx, message, recipient) => {
    const occasion = parseOccasion(message.occasion);
    if (!occasion) return refused(`Nothing is known of the occasion "${message.occasion}".`);
    const { silentOn } = await readMessageSettings(ctx.db, ctx.shop.id);
    if (silentOn.includes(occasion)) {
      return { is: 'withdrawn', reason: 'The shop keeps silent on this occasion now.' };
    }
    const visit = await readCustomerVisit(ctx.db, ctx, message.visitId);
    const pointless = whyPointless(occasion, visit);
    if (pointless) return { is: 'withdrawn', reason: pointless };

    const link = await visitLinkAddress(ctx.db, ctx, visit.id);
    const { language } = recipient;
    const locale: TextLocale = { language, region: ctx.shop.region };
    const { cause, channel } = message;
    const others = await readOthers(ctx, message.others);
    const leftOut = others.flatMap((other) => {
      const reason = whyPointless(occasion, other.visit);
      return reason ? [{ id: other.id, reason }] : [];
    });
    const along = others.filter(({ id }) => leftOut.every((left) => left.id !== id));
    const said = along.length > 0 ? 'moved-together' : occasion;
    const values = valuesOf(ctx, visit, {
      cause,
      locale,
      names: await whoComes(ctx.db, ctx, visit.id),
      link,
      choices: await choiceWords(ctx, cause.choices ?? [], locale),
      moves: movesWords(
        [{ visit, told: toldWindow(visit, cause), link }, ...along],
        channel,
        locale,
      ),
    });
    const ownWording = await readOwnWording(ctx.db, ctx.shop.id, { occasion: said, language });
    const input = { occasion: said, language, values, ownWording };
    if (channel === 'sms') {
      const { value, problems } = renderSms(input);
      return value === null ? refused(problems[0]?.message) : { is: 'sms', body: value, leftOut };
    }
    const copy = occasion === 'done' ? await signedCopyOf(ctx, visit.id) : null;
    return writeEmail(ctx, input, {
      visit,
      link,
      method: calendarMethod(occasion),
      along,
      leftOut,
      copy,
    });
  };
}

function writeEmail(
  ctx: Context<SystemActor>,
  input: RenderInput,
  it: {
    visit: CustomerVisit;
    link: string | null;
    method: CalendarMethod | null;
    /** Other visits that it tells of as well. */
    along: Moved[];
    leftOut: LeftOut[];
    copy: Attachment | null;
  },
): Composed {
  const { visit, link, method, along, leftOut, copy } = it;
  const { value, problems } = renderEmail(input);
  if (value === null) return refused(problems[0]?.message);
  const attachments = [...calendarFiles(ctx, along), ...(copy ? [copy] : [])];
  return {
    is: 'email',
    leftOut,
    email: {
      ...value,
      ...(ctx.shop.email ? { replyTo: ctx.shop.email } : {}),
      ...(method ? { ics: { method, content: visitCalendar(ctx, visit, { method, link }) } } : {}),
      ...(attachments.length > 0 ? { attachments } : {}),
    },
  };
}

function refused(why: string | undefined): Composed {
  return { is: 'refused', reason: why ?? 'It could not be written.' };
}

/** What the visit has become since makes some messages wrong or needless. */
function whyPointless(occasion: Occasion, visit: CustomerVisit): string | null {
  const { status } = visit;
  if (occasion === 'called-off') return status === 'called-off' ? null : 'It stands again.';
  if (occasion === 'help') return null;
  if (status === 'called-off') return 'The visit was called off.';
  if (occasion === 'done' || occasion === 'missed') return null;
  if (status === 'done' || status === 'missed') return 'The visit is over.';
  if (occasion === 'please-confirm' || occasion === 'asked-again') {
    if (status !== 'booked') return 'Confirmed already.';
    return visit.customerSays === '' ? null : 'They have answered already.';
  }
  if (occasion === 'on-my-way' || occasion === 'running-late') {
    if (status === 'on-site') return 'The crew is there.';
    return occasion === 'running-late' && !visit.expectedAt ? 'The visit was moved.' : null;
  }
  const isUnderWay = status === 'on-the-way' || status === 'on-site';
  return isUnderWay ? 'The crew is on the way already.' : null;
}

/** Reminders change nothing in a calendar. */
function calendarMethod(occasion: Occasion): CalendarMethod | null {
  if (occasion === 'called-off') return 'CANCEL';
  return occasion === 'booked' || occasion === 'moved' ? 'REQUEST' : null;
}
