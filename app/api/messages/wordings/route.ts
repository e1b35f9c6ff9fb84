import { z } from 'zod';
import { saveWordingInput } from '@/lib/contracts/wordings';
import { handle } from '@/server/base/handle';
import { listWordings } from '@/server/messages/list-wordings';
import { saveWording } from '@/server/messages/save-wording';

export const GET = handle(z.object({}), listWordings);
export const PATCH = handle(saveWordingInput, saveWording);
