/** The mark grown into a diagram: story shear from the roof to the base under forces that grow linearly with height. */
const stories = 14;
const top = 96;
const storyPx = 50;
const zeroX = 90;
const fullPx = 470;
const ground = top + stories * storyPx;

interface Step {
  readonly level: string;
  readonly y: number;
  /** share of the base shear carried by the story below this level */
  readonly share: number;
}

/** From the top: forces 14, 13, ... 1 of 105 at the levels; shares are their running sum. */
function steps(): readonly Step[] {
  const sum = (stories * (stories + 1)) / 2;
  let shear = 0;
  return Array.from({ length: stories }, (_, index) => {
    shear += stories - index;
    return {
      level: index === 0 ? 'Roof' : `L${stories + 1 - index}`,
      y: top + index * storyPx,
      share: shear / sum,
    };
  });
}

export function ShearDiagram() {
  const all = steps();
  const x = (share: number) => zeroX + share * fullPx;
  const outline = all.reduce((path, step) => `${path}H${x(step.share)}V${step.y + storyPx}`, `M${zeroX} ${top}`);
  return (
    <svg className="d" viewBox="0 0 720 900" width={720} height={900} aria-hidden="true">
      {all.map((step) => (
        <g key={step.level}>
          <line x1={zeroX} y1={step.y + 0.5} x2={x(step.share) + 56} y2={step.y + 0.5} className="hair" />
          <text x={zeroX - 20} y={step.y + 4} className="n e">
            {step.level}
          </text>
          <text x={x(step.share) + 10} y={step.y + storyPx / 2 + 4} className="n">
            {step.share.toFixed(2)}
          </text>
        </g>
      ))}
      <path d={outline} className="med" />
      <line x1={zeroX} y1={top} x2={zeroX} y2={ground} className="heavy" />
      <line x1={40} y1={ground + 2} x2={660} y2={ground + 2} className="gnd" />
      {Array.from({ length: 66 }, (_, index) => 52 + index * 9).map((tick) => (
        <line key={tick} x1={tick} y1={ground + 5} x2={tick - 7} y2={ground + 13} className="dim" />
      ))}
      <text x={zeroX} y={56} className="b">
        Story shear, share of the base shear
      </text>
      <text x={zeroX} y={74} className="n">
        forces growing with height, 14 equal stories
      </text>
    </svg>
  );
}
