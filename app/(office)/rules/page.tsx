import type { Metadata } from 'next';
import Link from 'next/link';
import { RuleHistory } from '@/components/rules/rule-history';
import { RuleSetPart } from '@/components/rules/rule-set-part';
import { RulesForm } from '@/components/rules/rules-form';
import { TitleBlock } from '@/components/ui/title-block';
import { phoneWords } from '@/lib/messages/phone-number';
import { paths } from '@/lib/paths';
import { may } from '@/lib/permissions';
import { pageContext } from '@/server/base/page-context';
import { getShopRules } from '@/server/shops/get-shop-rules';
import { listRuleChanges } from '@/server/shops/list-rule-changes';

export const metadata: Metadata = { title: 'Shop rules' };

export default async function RulesPage() {
  const ctx = await pageContext('shop:read');
  const kept = await getShopRules(ctx);
  const settings = { ...kept, phone: phoneWords(kept.phone, kept.region) };
  const mayChange = may(ctx.actor.role, 'shop:change');
  return (
    <>
      <TitleBlock
        level={1}
        title="Shop rules"
        meta={
          <span className="flex flex-wrap gap-x-4">
            a change never reaches a sheet that is released
            <Link href={paths.tools()} className="link">
              Measuring tools
            </Link>
            <Link href={paths.checklists()} className="link">
              Checklists
            </Link>
            {may(ctx.actor.role, 'programs:change') ? (
              <>
                <Link href={paths.start()} className="link">
                  Starting a shop
                </Link>
                <Link href={paths.programs()} className="link">
                  Other programs
                </Link>
              </>
            ) : null}
          </span>
        }
        className="mb-4"
      />
      <RulesForm key={JSON.stringify(settings)} settings={settings} mayChange={mayChange} />
      <div className="mt-8 flex flex-col gap-8">
        <RuleSetPart
          key={JSON.stringify([settings.fit.ruleSet, settings.fit.ownRuleSets])}
          settings={settings}
          mayChange={mayChange}
        />
        <RuleHistory lines={await listRuleChanges(ctx)} settings={settings} mayChange={mayChange} />
      </div>
    </>
  );
}
