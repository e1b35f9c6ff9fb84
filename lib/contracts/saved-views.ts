/** Views of a table that a person keeps under a name. */
import { z } from 'zod';

export const savedTableView = z.object({
  order: z.object({ column: z.string().max(40), isDescending: z.boolean() }).nullable(),
  typed: z.string().max(120),
  choices: z.record(z.string().max(40), z.string().max(120)),
});
export type SavedTableView = z.infer<typeof savedTableView>;

const tableName = z.string().regex(/^[a-z-]{1,40}$/);

export const listViewsInput = z.object({ table: tableName });
export type ListViewsInput = z.infer<typeof listViewsInput>;

/** Saved again under the same name, it is replaced. */
export const saveViewInput = z.object({
  table: tableName,
  name: z.string().trim().min(1, 'Give the view a name.').max(40),
  view: savedTableView,
});
export type SaveViewInput = z.infer<typeof saveViewInput>;

export const viewIdInput = z.object({ viewId: z.uuid() });
export type ViewIdInput = z.infer<typeof viewIdInput>;

export type SavedView = { id: string; name: string; view: SavedTableView };
