import { openInterface } from '@/server/programs/open-interface';

export const dynamic = 'force-dynamic';
/** Open to all: it says how to ask, and nothing of any shop. */
export const GET = async () => Response.json(openInterface());
