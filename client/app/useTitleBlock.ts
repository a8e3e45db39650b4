import { useEffect } from 'react';
import { useLocation, useParams } from 'react-router-dom';

import { useBuilding, useSession } from '../data/queries.ts';
import { caution } from './Foot.tsx';

/** A text as a CSS string; a line feed becomes a new line of the margin box. */
export const cssString = (text: string): string =>
  `"${text.replaceAll('\\', '\\\\').replaceAll('"', '\\"').replace(/\r?\n/g, '\\a ')}"`;

/** What stands in the title block of a sheet of paper: print.css sets these texts into the margin of every sheet. */
export function useTitleBlock(title: string): void {
  const { buildingId = '' } = useParams();
  const building = useBuilding(buildingId).data;
  const person = useSession().data?.person.name ?? '';
  const search = new URLSearchParams(useLocation().search);
  const view = ['case', 'level'].flatMap((name) => search.get(name) ?? []).join(', ');
  const number = building === undefined || building.number === '' ? '' : `${building.number}  `;
  const texts = {
    '--print-caution': caution,
    '--print-building': `${number}${building?.name ?? ''}\n${view === '' ? title : `${title}, ${view}`}`,
    '--print-state': `No revision issued, ${building?.state ?? ''}\nBy ${person}. ${building?.state === 'checked' ? 'Checked' : 'Not checked'}`,
  };
  const values = JSON.stringify(texts);
  useEffect(() => {
    const { style } = document.documentElement;
    const set = () => {
      for (const [name, text] of Object.entries(JSON.parse(values) as Record<string, string>)) {
        style.setProperty(name, cssString(text));
      }
      style.setProperty('--print-date', cssString(new Date().toISOString().slice(0, 10)));
    };
    set();
    window.addEventListener('beforeprint', set);
    return () => window.removeEventListener('beforeprint', set);
  }, [values]);
}
