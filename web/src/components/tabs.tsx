import { type KeyboardEvent, type ReactNode, useId, useRef } from 'react';

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

const STEPS: Readonly<Record<string, (at: number, many: number) => number>> = {
  ArrowRight: (at, many) => (at + 1) % many,
  ArrowLeft: (at, many) => (at - 1 + many) % many,
  Home: () => 0,
  End: (_at, many) => many - 1,
};

/** A few pages in one place, one shown at a time. Tab comes to the chosen one, the arrow keys choose another. */
export function Tabs<T extends string>({ label, tabs, chosen, onChoose }: TabsProps<T>) {
  const made = useId();
  const list = useRef<HTMLDivElement>(null);
  const tabId = (id: T): string => `${made}-${id}`;
  const panelId = (id: T): string => `${made}-${id}-page`;

  const onKeyDown = (event: KeyboardEvent): void => {
    const at = tabs.findIndex((tab) => tab.id === chosen);
    const next = STEPS[event.key]?.(at, tabs.length);
    const tab = next === undefined ? undefined : tabs[next];
    if (next === undefined || tab === undefined) return;
    event.preventDefault();
    onChoose(tab.id);
    list.current?.querySelectorAll('button')[next]?.focus();
  };
  return (
    <>
      <div ref={list} role="tablist" className="tab-list" aria-label={label} onKeyDown={onKeyDown}>
        {tabs.map((tab) => (
          <button
            key={tab.id}
            type="button"
            role="tab"
            id={tabId(tab.id)}
            className="tab"
            aria-selected={tab.id === chosen}
            aria-controls={panelId(tab.id)}
            tabIndex={tab.id === chosen ? 0 : -1}
            onClick={() => {
              onChoose(tab.id);
            }}
          >
            {tab.label}
          </button>
        ))}
      </div>
      {tabs.map((tab) => (
        <div
          key={tab.id}
          role="tabpanel"
          id={panelId(tab.id)}
          aria-labelledby={tabId(tab.id)}
          hidden={tab.id !== chosen}
          className="pt-4"
        >
          {tab.content}
        </div>
      ))}
    </>
  );
}
