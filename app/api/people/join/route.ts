import { joinShopInput } from '@/lib/contracts/people';
import { callerAddress } from '@/server/base/caller-address';
import { handleOpen } from '@/server/base/handle';
import { joinShop } from '@/server/people/join-shop';
import { signedInResponse } from '@/server/people/sign-in';

export const POST = handleOpen(joinShopInput, async (input, request) => {
  const { email } = await joinShop(input, callerAddress(request));
  return signedInResponse(email, input.password, request.headers);
});
