import { TitleBlock } from '@/components/ui/title-block';
import type { FitRules } from '@/lib/contracts/shop-rules';
import { fineLength } from '@/lib/sheet/reading-words';
import { tradeWord } from '@/lib/words/trade';
import { type ErrorOf, RuleField } from './rule-field';

type SheetGoodsProps = { fit: FitRules; errorOf: ErrorOf };

/** What the sheet is called and what it really measures, and how the crown stands against the wall. */
export function SheetGoods({ fit, errorOf }: SheetGoodsProps) {
  const crown = tradeWord('crown', fit.region);
  return (
    <section>
      <TitleBlock title={`Sheet and ${crown}`} meta="a calliper tells" />
      <RuleField
        label="Sheet is called"
        name="sheetNominalMm"
        defaultValue={fineLength(fit.sheetNominalMm, fit.unit)}
        hint="moves widths that stack sheets"
        errorOf={errorOf}
      />
      <RuleField
        label="Sheet really measures"
        name="sheetActualMm"
        defaultValue={fit.sheetActualMm === null ? '' : fineLength(fit.sheetActualMm, fit.unit)}
        hint="moves widths that stack sheets. Empty: not read, widths stay as drawn."
        errorOf={errorOf}
      />
      <RuleField
        label={`Spring of the ${crown}, degrees`}
        name="crownSpringDeg"
        type="number"
        step="any"
        defaultValue={fit.crownSpringDeg}
        hint="moves its mitres. Between its back and the wall; 38 and 45 are usual."
        errorOf={errorOf}
      />
    </section>
  );
}
