'use client';

import { Tabs as BaseTabs } from '@base-ui/react/tabs';

export type Tab = { value: string; label: React.ReactNode; panel: React.ReactNode };

/** Two or three views of one thing. The current one is underlined in ink and heavier. */
export function Tabs({ tabs, defaultValue, label }: { tabs: readonly Tab[]; defaultValue: string; label: string }) {
  return (
    <BaseTabs.Root defaultValue={defaultValue}>
      <BaseTabs.List aria-label={label} className="flex gap-6 border-b border-rule-2">
        {tabs.map((tab) => (
          <BaseTabs.Tab
            key={tab.value}
            value={tab.value}
            className="-mb-px min-h-11 cursor-pointer border-b-due border-transparent text-control font-text text-ink-2 data-active:border-ink data-active:font-emphasis data-active:text-ink"
          >
            {tab.label}
          </BaseTabs.Tab>
        ))}
      </BaseTabs.List>
      {tabs.map((tab) => (
        <BaseTabs.Panel key={tab.value} value={tab.value} className="pt-4">
          {tab.panel}
        </BaseTabs.Panel>
      ))}
    </BaseTabs.Root>
  );
}
