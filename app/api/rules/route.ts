import { z } from 'zod';
import { changeShopRulesInput } from '@/lib/contracts/shop-rules';
import { handle } from '@/server/base/handle';
import { changeShopRules } from '@/server/shops/change-shop-rules';
import { getShopRules } from '@/server/shops/get-shop-rules';

export const GET = handle(z.object({}), getShopRules);
export const PATCH = handle(changeShopRulesInput, changeShopRules);
