import { changeToolInput } from '@/lib/contracts/tools';
import { handle } from '@/server/base/handle';
import { changeTool } from '@/server/shops/change-tool';

export const PATCH = handle(changeToolInput, changeTool);
