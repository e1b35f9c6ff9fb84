'use client';

import { useState } from 'react';
import { SelectField } from '@/components/ui/select-field';
import { TitleBlock } from '@/components/ui/title-block';
import type { Tool } from '@/lib/contracts/wall-book';
import { type ToolKind, toolKindWords, toolWorth, usualSpec } from '@/lib/rules/tool-spec';
import type { LengthUnit } from '@/lib/units/brands';
import { ToolForm } from './tool-form';

type ToolsScreenProps = { tools: Tool[]; unit: LengthUnit; mayChange: boolean };

/** The shop's measuring tools: what each is worth, and the figures that make it so. */
export function ToolsScreen({ tools, unit, mayChange }: ToolsScreenProps) {
  const [kind, setKind] = useState<ToolKind>('laser');
  return (
    <div className="mt-4 grid gap-x-10 gap-y-8 xl:grid-cols-[minmax(0,3fr)_minmax(0,2fr)]">
      <section>
        <TitleBlock title="In the vans" meta={tools.length} />
        {tools.map((tool) => (
          <details key={tool.id} className="border-b border-rule">
            <summary className="flex min-h-9 cursor-pointer flex-wrap items-baseline justify-between gap-x-6 py-2">
              <span>
                <b>{tool.name}</b>{' '}
                <span className="text-graphite">{toolKindWords[tool.spec.kind]}</span>
              </span>
              <span className="tabular-nums">{toolWorth(tool.spec, unit)}</span>
            </summary>
            {mayChange ? (
              <ToolForm
                key={JSON.stringify(tool)}
                toolId={tool.id}
                name={tool.name}
                spec={tool.spec}
                unit={unit}
              />
            ) : null}
          </details>
        ))}
        <p className="max-w-prose pt-3 text-note text-graphite">
          ±: nineteen readings in twenty are within it. It comes from the tool’s own figures, and
          every size on a sheet is as sure as the tools it was read by.
        </p>
      </section>
      {mayChange ? (
        <section>
          <TitleBlock title="One more tool" className="mb-3" />
          <div className="max-w-2xl">
            <SelectField
              label="It is a"
              value={kind}
              onChange={(event) => setKind(kindOf(event.target.value))}
              options={Object.entries(toolKindWords).map(([value, label]) => ({ value, label }))}
            />
          </div>
          <ToolForm
            key={`${kind} ${tools.length}`}
            toolId={null}
            name=""
            spec={usualSpec(kind, unit)}
            unit={unit}
          />
        </section>
      ) : (
        <p className="text-graphite">The owner changes these.</p>
      )}
    </div>
  );
}

const kinds = Object.keys(toolKindWords) as ToolKind[];
const kindOf = (text: string): ToolKind => kinds.find((kind) => kind === text) ?? 'tape';
