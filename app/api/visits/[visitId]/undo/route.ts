import { undoVisitChangeInput } from '@/lib/contracts/visit-changes';
import { handle } from '@/server/base/handle';
import { undoVisitChange } from '@/server/visits/undo-visit-change';

export const POST = handle(undoVisitChangeInput, undoVisitChange);
