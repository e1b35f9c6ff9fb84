import { noteYesInput } from '@/lib/contracts/visits';
import { handle } from '@/server/base/handle';
import { noteYes } from '@/server/visits/note-yes';

export const POST = handle(noteYesInput, noteYes);
