import { sayReadyInput } from '@/lib/contracts/jobs';
import { handle } from '@/server/base/handle';
import { sayReady } from '@/server/jobs/say-ready';

export const POST = handle(sayReadyInput, sayReady);
