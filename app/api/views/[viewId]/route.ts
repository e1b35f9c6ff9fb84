import { viewIdInput } from '@/lib/contracts/saved-views';
import { handle } from '@/server/base/handle';
import { forgetView } from '@/server/people/saved-views';

export const DELETE = handle(viewIdInput, forgetView);
