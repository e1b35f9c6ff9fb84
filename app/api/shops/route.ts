import { createShopInput } from '@/lib/contracts/people';
import { callerAddress } from '@/server/base/caller-address';
import { handleOpen } from '@/server/base/handle';
import { signedInResponse } from '@/server/people/sign-in';
import { createShop } from '@/server/shops/create-shop';

export const POST = handleOpen(createShopInput, async (input, request) => {
  await createShop(input, callerAddress(request));
  return signedInResponse(input.email, input.password, request.headers);
});
