import { changeSnagInput } from '@/lib/contracts/snags';
import { handle } from '@/server/base/handle';
import { changeSnag } from '@/server/snags/change-snag';

export const PATCH = handle(changeSnagInput, changeSnag);
