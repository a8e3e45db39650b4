import type { ElevationView } from '../../data/elevationView.ts';

const boxWidth = 148;
const leastHeight = 84;
const maximum = 110;

/** px a unit of length: one of a few round scales, so that most buildings of a list stand at the same one. */
export function elevationScale(view: ElevationView, units: 'us' | 'si'): number {
  const feet = units === 'us' ? 1 : 3.28084;
  const width = widthOf(view) ?? 0;
  const steps = [1 / 2, 1 / 4, 1 / 8, 1 / 16].map((pxPerFoot) => pxPerFoot * feet);
  return steps.find((scale) => view.height * scale <= maximum && width * scale <= boxWidth - 24) ?? steps[3] ?? 0.05;
}

function widthOf(view: ElevationView): number | null {
  if (view.walls.length === 0) return null;
  const xs = view.walls.flatMap((wall) => [wall.x1, wall.x2]);
  return Math.max(...xs) - Math.min(...xs);
}

/** The building seen along y, heights and widths to one scale; walls across the view as strokes, in the view as tints. */
export function SmallElevation({ view, units }: { readonly view: ElevationView; readonly units: 'us' | 'si' }) {
  const scale = elevationScale(view, units);
  const boxHeight = Math.max(leastHeight, Math.ceil(view.height * scale) + 20);
  const ground = boxHeight - 8;
  const width = (widthOf(view) ?? view.height * 0.6) * scale;
  const left = (boxWidth - width) / 2;
  const low = view.walls.length === 0 ? 0 : Math.min(...view.walls.flatMap((wall) => [wall.x1, wall.x2]));
  const x = (value: number) => left + (value - low) * scale;
  const y = (elevation: number) => ground - (elevation - view.base) * scale;
  const fine = view.stories.length > 30;
  return (
    <svg
      className="d block"
      width={boxWidth}
      height={boxHeight}
      viewBox={`0 0 ${boxWidth} ${boxHeight}`}
      aria-hidden="true"
    >
      {view.walls.map((wall, index) => {
        const across = Math.abs(wall.x2 - wall.x1) * scale;
        return across < 2 ? null : (
          <rect
            key={index}
            x={x(Math.min(wall.x1, wall.x2))}
            y={y(wall.toElevation)}
            width={across}
            height={(wall.toElevation - wall.fromElevation) * scale}
            fill="var(--graphite)"
            fillOpacity={0.28}
          />
        );
      })}
      {view.stories.map((story) => (
        <line
          key={story.level}
          x1={left}
          x2={left + width}
          y1={y(story.elevation)}
          y2={y(story.elevation)}
          stroke="var(--graphite)"
          strokeWidth={fine ? 0.5 : 0.75}
        />
      ))}
      {view.walls.map((wall, index) =>
        Math.abs(wall.x2 - wall.x1) * scale >= 2 ? null : (
          <line
            key={index}
            x1={x(wall.x1)}
            x2={x(wall.x1)}
            y1={y(wall.toElevation)}
            y2={y(wall.fromElevation)}
            stroke="var(--ink)"
            strokeWidth={2}
          />
        ),
      )}
      <line
        x1={left - 10}
        x2={left + width + 10}
        y1={ground + 1}
        y2={ground + 1}
        stroke="var(--ink)"
        strokeWidth={2.5}
      />
    </svg>
  );
}
