/**
 * What W and E stand for: lists of parts {load, variant, by}, both ways. Wind cases 1 to 4 of Fig. 27.3-8 where asked;
 * seismic pairs of 100 and 30 % where asked and both directions have a case, eccentricity on one part only.
 */
const both = [1, -1];
const signs = (list, make) => list.flatMap((sign) => make(sign));

export function lateralStates(building, basis, kind) {
  const { settings } = building;
  const loads = building.cases.filter((load) => load.kind === kind);
  const turning = basis !== 'flexible';
  const single = (load, variant = '0') => signs(both, (sign) => [[{ load, variant, by: sign }]]);
  if (kind === 'wind') return settings.windCases ? windCases(loads, turning) : loads.flatMap((load) => single(load));
  const variants = settings.accidental > 0 && turning ? ['+', '-'] : ['0'];
  const [x, y] = ['x', 'y'].map((axis) => loads.filter(({ direction }) => direction === axis));
  if (!(settings.orthogonal > 0) || x.length === 0 || y.length === 0)
    return loads.flatMap((load) => variants.flatMap((variant) => single(load, variant)));
  const pairs = [...x.flatMap((a) => y.map((b) => [a, b])), ...y.flatMap((a) => x.map((b) => [a, b]))];
  const sides =
    variants.length === 1
      ? [['0', '0']]
      : [...variants.map((variant) => [variant, '0']), ...variants.map((variant) => ['0', variant])];
  return pairs.flatMap(([whole, part]) =>
    signs(both, (a) =>
      signs(both, (b) =>
        sides.map(([first, second]) => [
          { load: whole, variant: first, by: a },
          { load: part, variant: second, by: b * settings.orthogonal },
        ]),
      ),
    ),
  );
}

function windCases(loads, turning) {
  const [x, y] = ['x', 'y'].map((axis) => loads.filter(({ direction }) => direction === axis));
  const one = (load, by) => [{ load, variant: '0', by }];
  const turned = (load, by, side) => [
    ...one(load, by),
    ...(turning ? [{ load, variant: 'twist', by: by * side }] : []),
  ];
  const sides = turning ? both : [1]; // eccentricity can't act on flexible floors
  const pairs = x.flatMap((a) => y.map((b) => [a, b]));
  return [
    ...loads.flatMap((load) => both.map((a) => one(load, a))),
    ...loads.flatMap((load) => both.flatMap((a) => sides.map((e) => turned(load, 0.75 * a, e)))),
    ...pairs.flatMap(([p, q]) => both.flatMap((a) => both.map((b) => [...one(p, 0.75 * a), ...one(q, 0.75 * b)]))),
    ...pairs.flatMap(([p, q]) =>
      both.flatMap((a) =>
        both.flatMap((b) =>
          sides.flatMap((e) => sides.map((f) => [...turned(p, 0.563 * a, e), ...turned(q, 0.563 * b, f)])),
        ),
      ),
    ),
  ];
}
