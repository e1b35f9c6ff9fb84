import { TextField } from '@/components/ui/text-field';
import { TitleBlock } from '@/components/ui/title-block';
import type { FitRules } from '@/lib/contracts/shop-rules';
import { fineLength } from '@/lib/sheet/reading-words';
import { tradeWord } from '@/lib/words/trade';

type SheetGoodsProps = { fit: FitRules; errorOf: (field: string) => string | undefined };

/** What the sheet is called and what it really measures, and how the crown stands against the wall. */
export function SheetGoods({ fit, errorOf }: SheetGoodsProps) {
  const error = (field: string) => errorOf(field) ?? errorOf(`fit.${field}`);
  return (
    <section>
      <TitleBlock title={`Sheet and ${tradeWord('crown', fit.region)}`} meta="a calliper tells" />
      <div className="grid gap-3 py-3 sm:grid-cols-2">
        <TextField
          label="Sheet is called"
          name="sheetNominalMm"
          defaultValue={fineLength(fit.sheetNominalMm, fit.unit)}
          hint="moves widths that stack sheets"
          error={error('sheetNominalMm')}
        />
        <TextField
          label="Sheet really measures"
          name="sheetActualMm"
          defaultValue={fit.sheetActualMm === null ? '' : fineLength(fit.sheetActualMm, fit.unit)}
          hint="Empty: not read, widths stay as drawn."
          isOptional
          error={error('sheetActualMm')}
        />
        <TextField
          label={`Spring of the ${tradeWord('crown', fit.region)}, degrees`}
          name="crownSpringDeg"
          type="number"
          step="any"
          defaultValue={fit.crownSpringDeg}
          hint="Between its back and the wall; 38 and 45 are usual."
          error={error('crownSpringDeg')}
        />
      </div>
    </section>
  );
}
