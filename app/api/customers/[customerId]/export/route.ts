import { customerIdInput } from '@/lib/contracts/keeping';
import { handleFile } from '@/server/base/handle-file';
import { exportCustomer } from '@/server/keeping/export-customer';

export const GET = handleFile(customerIdInput, exportCustomer);
