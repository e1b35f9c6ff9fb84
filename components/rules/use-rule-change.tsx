'use client';

import { useRouter } from 'next/navigation';
import { type ReactNode, useState } from 'react';
import { askServer } from '@/components/shell/ask-server';
import { sayProblem } from '@/components/shell/say-problem';
import { showToast } from '@/components/ui/toast-store';
import type { RulePreview } from '@/lib/contracts/rule-changes';
import type { ChangeShopRulesInput, ShopSettings } from '@/lib/contracts/shop-rules';
import { apiPaths } from '@/lib/paths';
import { ChangePreview } from './change-preview';

type Looked = { preview: RulePreview; body: ChangeShopRulesInput };

type RuleChanger = {
  /** Shows what a change would do; rejects with what stands against it. */
  look: (body: ChangeShopRulesInput) => Promise<void>;
  /** Stands in the page while there is something to look at. */
  dialog: ReactNode;
};

/** A change of the rules is looked at before it is saved, and can be taken back for ten seconds after. */
export function useRuleChange(settings: ShopSettings): RuleChanger {
  const router = useRouter();
  const [looked, setLooked] = useState<Looked | null>(null);
  const [isSaving, setIsSaving] = useState(false);

  const look = async (body: ChangeShopRulesInput) => {
    const asked = { method: 'POST', body } as const;
    const preview = await askServer<RulePreview>(apiPaths.rulesPreview(), asked);
    if (preview.changes.length === 0) showToast({ text: 'Nothing is changed yet' });
    else setLooked({ preview, body });
  };
  const change = async (body: ChangeShopRulesInput, said: Parameters<typeof showToast>[0]) => {
    try {
      await askServer(apiPaths.rules(), { method: 'PATCH', body });
      showToast(said);
      router.refresh();
    } catch (caught) {
      sayProblem(caught);
    }
  };
  const save = async ({ body }: Looked) => {
    setIsSaving(true);
    await change(body, {
      text: 'Rules saved. Released sheets keep the rules they were made by.',
      undo: () => void change(asBefore(settings, body), { text: 'The rules are as they were' }),
    });
    setIsSaving(false);
    setLooked(null);
  };
  const dialog = looked ? (
    <ChangePreview
      preview={looked.preview}
      isBusy={isSaving}
      onSave={() => void save(looked)}
      onClose={() => setLooked(null)}
    />
  ) : null;
  return { look, dialog };
}

/** The same parts as they stand now; what is left to the usual is said so. */
function asBefore(settings: ShopSettings, body: ChangeShopRulesInput): ChangeShopRulesInput {
  const all = {
    ...settings,
    keeping: settings.keeping ?? { customerYears: null },
    checklists: settings.checklists ?? {},
  };
  const keys = Object.keys(body) as (keyof ChangeShopRulesInput)[];
  return Object.fromEntries(keys.map((key) => [key, all[key]]));
}
