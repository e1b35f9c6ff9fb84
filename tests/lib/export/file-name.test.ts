import { describe, expect, it } from 'vitest';
import { sheetFileKind } from '@/lib/contracts/sheet-files';
import { sheetFileName } from '@/lib/export/file-name';

const sheet = { jobNumber: 2418, roomName: 'Kitchen', revision: 'A' };

describe('sheetFileName', () => {
  it('says job, room and revision in plain words', () => {
    expect(sheetFileKind.options.map((kind) => sheetFileName(sheet, kind))).toEqual([
      '2418-kitchen-rev-A.pdf',
      '2418-kitchen-rev-A-cut-list.csv',
      '2418-kitchen-rev-A-drawings.svg',
      '2418-kitchen-rev-A-true-size.dxf',
    ]);
  });

  it.each([
    ['Utility / boot room', '2418-utility-boot-room-rev-A.pdf'],
    ['../../etc', '2418-etc-rev-A.pdf'],
    ['Küche "oben"', '2418-küche-oben-rev-A.pdf'],
    ['???', '2418-rev-A.pdf'],
  ])('makes %j a name that every file system takes', (roomName, expected) => {
    expect(sheetFileName({ ...sheet, roomName }, 'sheet.pdf')).toBe(expected);
  });
});
