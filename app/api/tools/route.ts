import { z } from 'zod';
import { addToolInput } from '@/lib/contracts/tools';
import { handle } from '@/server/base/handle';
import { addTool } from '@/server/shops/add-tool';
import { listTools } from '@/server/shops/list-tools';

export const GET = handle(z.object({}), listTools);
export const POST = handle(addToolInput, addTool);
