import { z } from 'zod';
import { makeFeedInput, revokeFeedInput } from '@/lib/contracts/feeds';
import { handle } from '@/server/base/handle';
import { listFeeds } from '@/server/days/list-feeds';
import { makeFeed } from '@/server/days/make-feed';
import { revokeFeed } from '@/server/days/revoke-feed';

export const GET = handle(z.object({}), listFeeds);
export const POST = handle(makeFeedInput, makeFeed);
export const DELETE = handle(revokeFeedInput, revokeFeed);
