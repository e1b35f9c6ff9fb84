import { changeShopRulesInput } from '@/lib/contracts/shop-rules';
import { handle } from '@/server/base/handle';
import { previewRules } from '@/server/sheets/preview-rules';

export const POST = handle(changeShopRulesInput, previewRules);
