import { invitePersonInput } from '@/lib/contracts/people';
import { handle } from '@/server/base/handle';
import { invitePerson } from '@/server/people/invite-person';

export const POST = handle(invitePersonInput, invitePerson);
