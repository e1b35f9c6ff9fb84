import { handleLive } from '@/server/base/handle-live';

export const GET = handleLive();
