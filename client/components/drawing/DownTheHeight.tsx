import type { ReactElement } from 'react';

import { drawHeightDiagram } from '#shared/drawing/heightDiagram';
import type { HeightDiagramInput } from '#shared/drawing/heightDiagramTypes';

import { DrawingSvg } from './DrawingSvg.tsx';

export interface DownTheHeightProps {
  diagrams: readonly { title: string; unit: string; input: HeightDiagramInput }[];
}

/** Axial, shear and moment of a wall side by side on the vertical scale of the stack. */
export function DownTheHeight({ diagrams }: DownTheHeightProps): ReactElement {
  return (
    <figure aria-label="Down the height" className="m-0 flex gap-[28px]">
      {diagrams.map(({ title, unit, input }) => (
        <div key={title} className="w-[216px]">
          <div className="cap">
            <span>{title}</span>
            <span>{unit}</span>
          </div>
          <DrawingSvg drawing={drawHeightDiagram(input)} />
        </div>
      ))}
    </figure>
  );
}
