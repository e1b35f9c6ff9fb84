import { auth } from '@/server/base/auth';
import { answering } from '@/server/base/handle';

const pass = answering(async (request) => (await auth()).handler(request));

export const GET = pass;
export const POST = pass;
