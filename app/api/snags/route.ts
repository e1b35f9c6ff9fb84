import { listSnagsInput, openSnagInput } from '@/lib/contracts/snags';
import { handle } from '@/server/base/handle';
import { listSnags } from '@/server/snags/list-snags';
import { openSnag } from '@/server/snags/open-snag';

export const GET = handle(listSnagsInput, listSnags);
export const POST = handle(openSnagInput, openSnag);
