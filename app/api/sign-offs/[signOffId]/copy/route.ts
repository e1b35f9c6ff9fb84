import { z } from 'zod';
import { handleFile } from '@/server/base/handle-file';
import { getSignOffCopy } from '@/server/snags/get-sign-off-copy';

export const GET = handleFile(z.object({ signOffId: z.uuid() }), getSignOffCopy);
