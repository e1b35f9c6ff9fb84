import { auth } from '@/server/base/auth';
import { answering } from '@/server/base/handle';

const answer = answering(async (request) => (await auth()).handler(request));
const pass = (request: Request) => answer(request);

export const GET = pass;
export const POST = pass;
