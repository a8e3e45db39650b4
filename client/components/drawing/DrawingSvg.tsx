import { useId, type ReactElement } from 'react';

import type { Drawing, DrawingElement, Paint, TextElement } from '#shared/drawing/elements';

/** Draws what a builder of shared/drawing answers; colors by token, so that night and print follow by themselves. */
export function DrawingSvg({ drawing }: { drawing: Drawing }): ReactElement {
  const id = useId();
  const paint = (name: Paint | undefined): string | undefined => {
    if (name === undefined || name === 'none') return name;
    return name.startsWith('hatch') ? `url(#${id}${name})` : `var(--${name})`;
  };
  const { width, height } = drawing;
  return (
    <svg
      width={width}
      height={height}
      viewBox={`0 0 ${width} ${height}`}
      aria-hidden="true"
      className="block max-w-none overflow-visible"
    >
      <defs>
        <HatchPattern id={`${id}hatch-ink`} color="var(--ink)" size={4} stripe={1.5} />
        <HatchPattern id={`${id}hatch-oxide`} color="var(--oxide)" size={5} stripe={2.2} />
      </defs>
      {drawing.elements.map((element, index) => (
        <Shape key={index} element={element} paint={paint} />
      ))}
    </svg>
  );
}

interface HatchProps {
  id: string;
  color: string;
  size: number;
  stripe: number;
}

function HatchPattern({ id, color, size, stripe }: HatchProps): ReactElement {
  return (
    <pattern id={id} width={size} height={size} patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
      <rect width={size} height={size} fill="var(--sheet)" />
      <rect width={stripe} height={size} fill={color} />
    </pattern>
  );
}

interface ShapeProps {
  element: DrawingElement;
  paint: (name: Paint | undefined) => string | undefined;
}

function Shape({ element, paint }: ShapeProps): ReactElement {
  if (element.shape === 'text') return <Words element={element} paint={paint} />;
  const shared = {
    fill: paint(element.fill ?? 'none'),
    fillOpacity: element.fillOpacity,
    stroke: paint(element.stroke),
    strokeWidth: element.strokeWidth,
    strokeDasharray: element.dash,
  };
  switch (element.shape) {
    case 'rect':
      return <rect x={element.x} y={element.y} width={element.width} height={element.height} {...shared} />;
    case 'line':
      return <line x1={element.x1} y1={element.y1} x2={element.x2} y2={element.y2} {...shared} />;
    case 'circle':
      return <circle cx={element.cx} cy={element.cy} r={element.r} {...shared} />;
    case 'path':
      return <path d={element.d} {...shared} />;
  }
}

function Words({ element, paint }: { element: TextElement; paint: ShapeProps['paint'] }): ReactElement {
  return (
    <text
      x={element.x}
      y={element.y}
      fill={paint(element.fill)}
      fontSize={element.size}
      fontWeight={element.weight ?? 400}
      textAnchor={element.anchor}
      paintOrder={element.halo ? 'stroke' : undefined}
      stroke={paint(element.halo)}
      strokeWidth={element.halo ? 4 : undefined}
      strokeLinejoin={element.halo ? 'round' : undefined}
    >
      {element.text}
    </text>
  );
}
