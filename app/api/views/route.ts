import { listViewsInput, saveViewInput } from '@/lib/contracts/saved-views';
import { handle } from '@/server/base/handle';
import { listViews, saveView } from '@/server/people/saved-views';

export const GET = handle(listViewsInput, listViews);
export const POST = handle(saveViewInput, saveView);
