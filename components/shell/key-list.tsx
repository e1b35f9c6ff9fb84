'use client';

import { useState } from 'react';
import { CheckField } from '@/components/ui/check-field';
import { Dialog } from '@/components/ui/dialog';
import { KeyHint } from '@/components/ui/key-hint';
import { keySigns } from './key-bindings';
import { areSingleKeysOn, keepSingleKeys } from './key-listener';
import { pageKeyGroups } from './page-keys';

/** What every key does here: the page's own first, then the office's. */
export function KeyList({ onClose }: { onClose: () => void }) {
  const [isOn, setIsOn] = useState(areSingleKeysOn);
  return (
    <Dialog isOpen onClose={onClose} title="Keys">
      <div className="grid gap-5 sm:grid-cols-2">
        {[...pageKeyGroups()].reverse().map((group) => (
          <section key={group.title}>
            <h3 className="border-b border-rule pb-1 font-bold">{group.title}</h3>
            <dl>
              {group.bindings.map((binding) => (
                <div key={binding.keys} className="flex items-baseline justify-between gap-3 py-1">
                  <dt>{binding.words}</dt>
                  <dd>
                    <KeyHint keys={keySigns(binding.keys)} />
                    <span className="sr-only">{keySigns(binding.keys)}</span>
                  </dd>
                </div>
              ))}
            </dl>
          </section>
        ))}
      </div>
      <CheckField
        label="Single keys do things"
        hint="Turn off if you dictate to this computer, or press keys by accident."
        checked={isOn}
        onChange={(event) => {
          keepSingleKeys(event.target.checked);
          setIsOn(event.target.checked);
        }}
      />
    </Dialog>
  );
}
