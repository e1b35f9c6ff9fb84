import { closeSnagInput } from '@/lib/contracts/snags';
import { handle } from '@/server/base/handle';
import { closeSnag } from '@/server/snags/close-snag';

export const POST = handle(closeSnagInput, closeSnag);
