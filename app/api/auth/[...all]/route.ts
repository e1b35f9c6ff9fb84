import { auth } from '@/server/base/auth';

const pass = async (request: Request) => (await auth()).handler(request);

export const GET = pass;
export const POST = pass;
