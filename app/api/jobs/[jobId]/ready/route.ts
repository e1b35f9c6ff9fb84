import { sayReadyInput } from '@/lib/contracts/jobs';
import { handle } from '@/server/base/handle';
import { sayReady } from '@/server/visits/say-ready';

export const POST = handle(sayReadyInput, sayReady);
