import { createHash } from 'node:crypto';
import { and, eq } from 'drizzle-orm';
import { releases } from '@/db/schema';
import type { SheetView } from '@/lib/contracts/rooms';
import type { SheetFileInput, SheetFileKind } from '@/lib/contracts/sheet-files';
import { cutListCsv } from '@/lib/export/cut-list-csv';
import { sheetFileName } from '@/lib/export/file-name';
import { sheetDxf } from '@/lib/export/sheet-dxf';
import { sheetSvg } from '@/lib/export/sheet-svg';
import { formatDayShort, formatTime } from '@/lib/time/format-instant';
import { toLocal } from '@/lib/time/local-moment';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import type { FileAnswer } from '@/server/base/handle-file';
import { notFound } from '@/server/base/problem-response';
import { getSheet } from './get-sheet';
import { sheetPdf } from './sheet-pdf';

type Made = { mediaType: string; make: (sheet: SheetView) => string | Promise<Uint8Array> };

/** A released sheet as a file to take away: made from what was frozen, and saying whether it still holds. */
export async function getSheetFile(
  ctx: PersonContext,
  { releaseId, kind }: SheetFileInput,
): Promise<FileAnswer> {
  mustBeAllowed(ctx, 'sheets:read');
  const [found] = await ctx.db
    .select({
      roomId: releases.roomId,
      revision: releases.revision,
      releasedAt: releases.releasedAt,
    })
    .from(releases)
    .where(and(eq(releases.shopId, ctx.shop.id), eq(releases.id, releaseId)));
  if (!found) throw notFound('sheet');
  const { roomId, revision, releasedAt } = found;
  const sheet = await getSheet(ctx, { roomId, revision });
  const { mediaType, make } = makers(ctx, releasedAt)[kind];
  const bytes = Buffer.from(await make(sheet));
  return {
    name: sheetFileName({ ...sheet, revision }, kind),
    mediaType,
    bytes: bytes.length,
    mark: createHash('sha256').update(bytes).digest('hex'),
    isSaved: true,
    open: async () => new Blob([bytes]).stream(),
  };
}

function makers(ctx: PersonContext, releasedAt: Date): Record<SheetFileKind, Made> {
  const { zone, region } = ctx.shop;
  const time = formatTime(ctx.now, zone, { language: 'en', region });
  const print = {
    size: region === 'US' ? 'letter' : 'A4',
    releasedOn: dayWithYear(ctx, releasedAt),
    printedAt: `${dayWithYear(ctx, ctx.now)}, ${time}`,
    printedOn: ctx.now,
  } as const;
  return {
    'sheet.pdf': { mediaType: 'application/pdf', make: (sheet) => sheetPdf(sheet, print) },
    'cut-list.csv': { mediaType: 'text/csv; charset=utf-8; header=present', make: cutListCsv },
    'drawings.svg': { mediaType: 'image/svg+xml; charset=utf-8', make: sheetSvg },
    'drawings.dxf': { mediaType: 'image/vnd.dxf', make: sheetDxf },
  };
}

/** "Tue, Dec 1, 2026": paper lies about longer than a screen, so it names the year. */
function dayWithYear({ shop: { zone, region } }: PersonContext, instant: Date): string {
  const year = toLocal(instant, zone).date.slice(0, 4);
  const day = formatDayShort(instant, zone, { language: 'en', region });
  return region === 'US' ? `${day}, ${year}` : `${day} ${year}`;
}
