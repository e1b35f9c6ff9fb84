import type { SheetView } from '@/lib/contracts/rooms';

/**
 * What stands in red across a sheet that no longer holds; null while it does.
 *
 * Edge: without a newer revision, what was read or laid out after the release is the reason.
 * Example: revision A after B was released: "superseded by revision B".
 */
export function supersededWords(
  sheet: Pick<SheetView, 'newerRevision' | 'supersededBy'>,
): string | null {
  if (sheet.newerRevision) return `superseded by revision ${sheet.newerRevision}`;
  return sheet.supersededBy.length > 0 ? 'superseded: the room has changed since' : null;
}
