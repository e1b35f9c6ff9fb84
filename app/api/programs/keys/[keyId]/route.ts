import { keyIdInput } from '@/lib/contracts/programs';
import { handle } from '@/server/base/handle';
import { revokeKey } from '@/server/programs/revoke-key';

export const DELETE = handle(keyIdInput, revokeKey);
