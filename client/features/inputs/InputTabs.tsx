import { useRef, type KeyboardEvent } from 'react';
import { Link, useLocation } from 'react-router-dom';

import { inputTabs, paths, type InputTab } from '../../app/paths.ts';
import { carriedSearch } from '../../app/useChoice.ts';
import { tabNames } from './tabNames.ts';

export interface InputTabsProps {
  readonly buildingId: string;
  readonly tab: InputTab;
  readonly counts: Readonly<Partial<Record<InputTab, number>>>;
}

/** One tab a table; the tab is in the address. Left and Right go from tab to tab. */
export function InputTabs({ buildingId, tab, counts }: InputTabsProps) {
  const search = carriedSearch(useLocation().search);
  const list = useRef<HTMLDivElement>(null);
  const onKeyDown = (event: KeyboardEvent) => {
    const by = event.key === 'ArrowRight' ? 1 : event.key === 'ArrowLeft' ? -1 : 0;
    if (by === 0) return;
    event.preventDefault();
    const tabs = [...(list.current?.querySelectorAll<HTMLElement>('[role=tab]') ?? [])];
    const at = tabs.findIndex((one) => one === document.activeElement);
    tabs[(at + by + tabs.length) % tabs.length]?.focus();
  };
  return (
    <div ref={list} className="gw-tabs" role="tablist" aria-label="Input tables" onKeyDown={onKeyDown}>
      {inputTabs.map((one) => (
        <Link
          key={one}
          role="tab"
          id={`tab-${one}`}
          aria-selected={one === tab}
          aria-controls={one === tab ? 'input-pane' : undefined}
          tabIndex={one === tab ? 0 : -1}
          to={`${paths.inputs(buildingId, one)}${search}`}
        >
          {tabNames[one]}
          {counts[one] === undefined ? null : <small aria-hidden="true">{counts[one].toLocaleString('en-US')}</small>}
        </Link>
      ))}
    </div>
  );
}
