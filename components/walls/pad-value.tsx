import type { ReactNode } from 'react';
import { FractionText } from '@/components/ui/fraction-text';
import { fractionParts } from '@/lib/units/fraction-parts';
import { entryText, isEmptyEntry, type PadEntry } from '@/lib/walls-pad/pad-entry';

/** An entry set like a dimension, large or in a chip; a screen reader hears the plain text. */
export function PadValue({ entry, emptyText = '–' }: { entry: PadEntry; emptyText?: ReactNode }) {
  if (isEmptyEntry(entry) && !entry.isNegative) {
    return <span className="text-graphite">{emptyText}</span>;
  }
  const { isNegative, feet, whole, sixtyFourths } = entry;
  const parts = fractionParts((sixtyFourths * 25.4) / 64, 25.4 / 64);
  return (
    <>
      <span className="sr-only">{entryText(entry)}</span>
      <span aria-hidden="true" className="whitespace-nowrap">
        {isNegative ? '−' : ''}
        {feet === null ? '' : `${feet}′ `}
        {whole}
        {sixtyFourths > 0 ? (
          <span className={whole === '' ? '' : 'ml-[0.14em]'}>
            <FractionText {...parts} />
          </span>
        ) : null}
        {entry.unit === 'deg' ? '°' : ''}
      </span>
    </>
  );
}
