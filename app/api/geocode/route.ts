import { findAddressInput } from '@/lib/contracts/travel';
import { handle } from '@/server/base/handle';
import { findAddress } from '@/server/shops/find-address';

export const GET = handle(findAddressInput, findAddress);
