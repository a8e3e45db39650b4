export type ArtName = 'empty' | 'filling' | 'broken' | 'closed' | 'unheld';

const floors = [30, 52, 74, 96, 118, 140, 162, 184, 206];

function Ground({ y = 229 }: { readonly y?: number }) {
  const ticks = Array.from({ length: 20 }, (_, i) => 17 + i * 9);
  return (
    <>
      <line x1={10} y1={y} x2={190} y2={y} className="gnd" strokeWidth={3} />
      {ticks.map((x) => (
        <line key={x} x1={x} y1={y + 3} x2={x - 5} y2={y + 9} className="dim" />
      ))}
    </>
  );
}

function Outline() {
  return (
    <>
      {floors.map((y) => (
        <line key={y} x1={30} y1={y + 0.5} x2={170} y2={y + 0.5} className="hair" strokeDasharray="5 4" />
      ))}
      <line x1={30} y1={30} x2={30} y2={228} className="fine" strokeDasharray="5 4" />
      <line x1={170} y1={30} x2={170} y2={228} className="fine" strokeDasharray="5 4" />
    </>
  );
}

const closedWalls = ['M30 90V150', 'M80 90V150', 'M28 90H82', 'M120 60H170', 'M170 110V160', 'M110 190H160'];

/** Small drawings beside the words of a state; hidden from assistive technology, the words say it all. */
export function StateArt({ name }: { readonly name: ArtName }) {
  return (
    <svg className="d" width={200} height={250} viewBox="0 0 200 250" aria-hidden="true">
      {name === 'empty' || name === 'filling' ? (
        <>
          <Outline />
          <Ground />
        </>
      ) : null}
      {name === 'filling'
        ? [213, 191, 169, 147, 125, 103].map((y, i) => (
            <rect key={y} x={31} y={y} width={120 - i * 13} height={8} className="ink" />
          ))
        : null}
      {name === 'broken' ? (
        <>
          <Ground />
          <line x1={60} y1={30} x2={60} y2={228} className="heavy" />
          <path d="M60 30H76V63H96V96H112V120" className="med" />
          <path d="M124 150V163H134V196H142V228" className="med" />
          <path d="M104 124l18 4l-12 8l16 8" fill="none" stroke="var(--oxide)" strokeWidth={1.5} />
          <line x1={60} y1={228} x2={142} y2={228} className="fine" />
        </>
      ) : null}
      {name === 'closed' ? (
        <>
          <defs>
            <pattern id="closed-hatch" width={6} height={6} patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
              <rect width={1} height={6} fill="var(--line)" />
            </pattern>
          </defs>
          <rect
            x={20}
            y={50}
            width={160}
            height={150}
            fill="url(#closed-hatch)"
            stroke="var(--line)"
            strokeWidth={1.5}
          />
          {closedWalls.map((d) => (
            <path key={d} d={d} fill="none" stroke="var(--sheet)" strokeWidth={9} />
          ))}
          {closedWalls.map((d) => (
            <path key={`${d} ink`} d={d} fill="none" stroke="var(--ink)" strokeWidth={5} />
          ))}
        </>
      ) : null}
      {name === 'unheld' ? (
        <>
          <rect x={20} y={60} width={160} height={120} fill="none" stroke="var(--line)" strokeWidth={1.5} />
          {[40, 90, 150].map((x) => (
            <line key={x} x1={x} y1={80} x2={x} y2={160} stroke="var(--ink)" strokeWidth={5} />
          ))}
          <path d="M60 195H140" fill="none" stroke="var(--oxide)" strokeWidth={1.5} />
          <path d="M140 195l-8-4v8zM60 195l8-4v8z" fill="var(--oxide)" />
        </>
      ) : null}
    </svg>
  );
}
