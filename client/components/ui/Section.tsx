import type { ReactNode } from 'react';

export interface SectionProps {
  readonly title: string;
  /** small text at the right end of the rule */
  readonly aside?: ReactNode;
  readonly label?: string;
  readonly children: ReactNode;
}

/** A 17 px head on an ink rule; no box around it. */
export function Section({ title, aside, label, children }: SectionProps) {
  return (
    <section aria-label={label ?? title}>
      <div className="gw-section">
        <h2>{title}</h2>
        {aside === undefined ? null : <span className="note ml-auto">{aside}</span>}
      </div>
      {children}
    </section>
  );
}
