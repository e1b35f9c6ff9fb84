import { ruleChangeInput } from '@/lib/contracts/rule-changes';
import { handle } from '@/server/base/handle';
import { getChangeBack } from '@/server/shops/get-change-back';

export const GET = handle(ruleChangeInput, getChangeBack);
