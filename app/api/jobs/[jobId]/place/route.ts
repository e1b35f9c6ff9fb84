import { placeSiteInput } from '@/lib/contracts/travel';
import { handle } from '@/server/base/handle';
import { placeSite } from '@/server/jobs/place-site';

export const PATCH = handle(placeSiteInput, placeSite);
