import * as Ariakit from '@ariakit/react';
import type { ReactNode } from 'react';

export interface TabPage<T extends string> {
  readonly id: T;
  readonly label: string;
  readonly content: ReactNode;
}

interface TabsProps<T extends string> {
  /** What the tabs choose between, for readers. */
  readonly label: string;
  readonly tabs: readonly TabPage<T>[];
  readonly chosen: T;
  readonly onChoose: (id: T) => void;
}

/** A few pages in one place, one shown at a time. */
export function Tabs<T extends string>({ label, tabs, chosen, onChoose }: TabsProps<T>) {
  return (
    <Ariakit.TabProvider
      selectedId={chosen}
      setSelectedId={(id) => {
        const tab = tabs.find((candidate) => candidate.id === id);
        if (tab !== undefined) onChoose(tab.id);
      }}
    >
      <Ariakit.TabList className="tab-list" aria-label={label}>
        {tabs.map((tab) => (
          <Ariakit.Tab key={tab.id} id={tab.id} className="tab">
            {tab.label}
          </Ariakit.Tab>
        ))}
      </Ariakit.TabList>
      {tabs.map((tab) => (
        <Ariakit.TabPanel key={tab.id} tabId={tab.id} className="pt-4">
          {tab.content}
        </Ariakit.TabPanel>
      ))}
    </Ariakit.TabProvider>
  );
}
