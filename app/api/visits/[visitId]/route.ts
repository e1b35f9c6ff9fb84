import { moveVisitInput, visitIdInput } from '@/lib/contracts/visits';
import { handle } from '@/server/base/handle';
import { getVisit } from '@/server/visits/get-visit';
import { moveVisit } from '@/server/visits/move-visit';

export const GET = handle(visitIdInput, getVisit);
export const PATCH = handle(moveVisitInput, moveVisit);
