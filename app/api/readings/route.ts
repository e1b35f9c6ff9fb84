import { recordReadingsInput } from '@/lib/contracts/rooms';
import { handle } from '@/server/base/handle';
import { recordReadings } from '@/server/walls/record-readings';

export const POST = handle(recordReadingsInput, recordReadings);
