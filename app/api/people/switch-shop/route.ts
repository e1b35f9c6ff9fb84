import { switchShopInput } from '@/lib/contracts/people';
import { handle } from '@/server/base/handle';
import { switchShop } from '@/server/people/switch-shop';

export const POST = handle(switchShopInput, switchShop);
