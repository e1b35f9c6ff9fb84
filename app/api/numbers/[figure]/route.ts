import { numbersFileInput } from '@/lib/contracts/numbers';
import { handleFile } from '@/server/base/handle-file';
import { getNumbersFile } from '@/server/numbers/get-numbers-file';

export const GET = handleFile(numbersFileInput, getNumbersFile);
