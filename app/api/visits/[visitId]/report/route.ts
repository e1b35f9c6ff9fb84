import { reportVisitInput } from '@/lib/contracts/visits';
import { handle } from '@/server/base/handle';
import { reportVisit } from '@/server/visits/report-visit';

export const POST = handle(reportVisitInput, reportVisit);
