import type { ReactElement } from 'react';

export interface WallButtonProps {
  readonly wall: string;
  readonly chosen: boolean;
  readonly onChoose: (wall: string) => void;
}

/** The name of a wall at the head of its row: choosing it chooses the wall for the page. */
export const WallButton = ({ wall, chosen, onChoose }: WallButtonProps): ReactElement => (
  <button
    type="button"
    className="-my-[2px] min-h-[24px] min-w-[24px] px-2 text-left font-medium hover:underline"
    aria-pressed={chosen}
    onClick={(event) => {
      event.stopPropagation();
      onChoose(wall);
    }}
  >
    {wall}
  </button>
);
