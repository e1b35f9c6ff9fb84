import { z } from 'zod';
import { handleFile } from '@/server/base/handle-file';
import { exportList } from '@/server/jobs/export-list';

export const GET = handleFile(z.object({}), exportList);
