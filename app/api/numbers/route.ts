import { numbersInput } from '@/lib/contracts/numbers';
import { handle } from '@/server/base/handle';
import { getNumbers } from '@/server/numbers/get-numbers';

export const GET = handle(numbersInput, getNumbers);
