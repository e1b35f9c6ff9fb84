import { demoReplyInput } from '@/lib/contracts/demo';
import { paths } from '@/lib/paths';
import { handleOpen } from '@/server/base/handle';
import { replyAsCustomer } from '@/server/demo/reply-as-customer';

export const POST = handleOpen(demoReplyInput, async (input) => {
  await replyAsCustomer(input);
  return new Response(null, {
    status: 303,
    headers: { location: paths.demoPhoneOf({ number: input.number }) },
  });
});
