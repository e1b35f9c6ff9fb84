/** The files that a released sheet can be taken away as. */
import { z } from 'zod';

export const sheetFileKind = z.enum(['sheet.pdf', 'cut-list.csv', 'drawings.svg', 'drawings.dxf']);
export type SheetFileKind = z.infer<typeof sheetFileKind>;

export const sheetFileInput = z.object({ releaseId: z.uuid(), kind: sheetFileKind });
export type SheetFileInput = z.infer<typeof sheetFileInput>;
