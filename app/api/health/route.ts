import { checkHealth } from '@/server/base/check-health';

export const dynamic = 'force-dynamic';
export const GET = checkHealth;
