import { customerIdInput, eraseCustomerInput } from '@/lib/contracts/keeping';
import { handle } from '@/server/base/handle';
import { eraseCustomer } from '@/server/keeping/erase-customer';
import { previewErasure } from '@/server/keeping/preview-erasure';

export const GET = handle(customerIdInput, previewErasure);
export const POST = handle(eraseCustomerInput, eraseCustomer);
