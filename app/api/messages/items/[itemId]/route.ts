import { tickOffInput } from '@/lib/contracts/messages';
import { handle } from '@/server/base/handle';
import { tickOff } from '@/server/messages/tick-off';

export const DELETE = handle(tickOffInput, tickOff);
