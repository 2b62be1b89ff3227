/** Tabs and their panel by the tab pattern of the WAI-ARIA Authoring Practices; ids are made from the name of the strip. */

import { type KeyboardEvent, type ReactNode, useRef } from 'react';
import { tabAfter } from './tab-keys.ts';

/** A tab by its id and what is written on it. */
export interface Tab<Id extends string> {
  readonly id: Id;
  readonly label: string;
}

interface TabStripProps<Id extends string> {
  /** Parts the ids of one strip and its panels from another's. */
  readonly name: string;
  /** What the tabs are about, for whoever cannot see them. */
  readonly label: string;
  readonly tabs: readonly Tab<Id>[];
  readonly selected: Id;
  readonly onSelect: (id: Id) => void;
}

const tabId = (name: string, id: string) => `${name}-tab-${id}`;
const panelId = (name: string, id: string) => `${name}-panel-${id}`;

/** A row of tabs; arrow keys select the next one. */
export function TabStrip<Id extends string>({ name, label, tabs, selected, onSelect }: TabStripProps<Id>) {
  const strip = useRef<HTMLDivElement>(null);
  const onKeyDown = (event: KeyboardEvent) => {
    const index = tabs.findIndex(tab => tab.id === selected);
    const next = tabAfter(event.key, index, tabs.length);
    const tab = next === null ? undefined : tabs[next];
    if (tab === undefined) return;
    event.preventDefault();
    onSelect(tab.id);
    strip.current?.querySelector<HTMLElement>(`#${CSS.escape(tabId(name, tab.id))}`)?.focus();
  };
  return (
    <div className="tab-strip" role="tablist" aria-label={label} ref={strip} onKeyDown={onKeyDown}>
      {tabs.map(({ id, label: text }) => (
        <button
          key={id}
          type="button"
          role="tab"
          id={tabId(name, id)}
          className="tab-strip-tab"
          aria-selected={id === selected}
          aria-controls={id === selected ? panelId(name, id) : undefined}
          tabIndex={id === selected ? 0 : -1}
          onClick={() => onSelect(id)}
        >
          {text}
        </button>
      ))}
    </div>
  );
}

interface TabPanelProps {
  readonly name: string;
  readonly id: string;
  readonly children?: ReactNode;
}

/** What the selected tab of the strip with the same name shows. */
export function TabPanel({ name, id, children }: TabPanelProps) {
  return (
    <div role="tabpanel" className="tab-panel" id={panelId(name, id)} aria-labelledby={tabId(name, id)}>
      {children}
    </div>
  );
}
