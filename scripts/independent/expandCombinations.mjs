import { lateralStates } from './lateralStates.mjs';

/** Own reader of combination text: recursive descent over characters, answering every alternative's factors at once. */
const symbols = ['Omega0', 'SDS', 'rho', 'Lr', 'D', 'L', 'S', 'R', 'W', 'E', 'H', 'F', 'T'];

export function readCombination(text, constants) {
  let at = 0;
  const peek = () => {
    while (/\s/.test(text[at] ?? '')) at += 1;
    return text[at] ?? '';
  };
  // a value is a list of alternatives; each is {one: number} for constants or {D: ..} for loads
  const pairs = (a, b, join) => a.flatMap((left) => b.map((right) => join(left, right)));
  const add = (sign) => (left, right) => {
    const sum = { ...left };
    for (const [key, value] of Object.entries(right)) sum[key] = (sum[key] ?? 0) + sign * value;
    return sum;
  };
  const scale = (form, by) => Object.fromEntries(Object.entries(form).map(([key, value]) => [key, value * by]));
  const times = (left, right) => ('one' in left ? scale(right, left.one) : scale(left, right.one));
  const choices = () => {
    let list = sum();
    while (peek() === 'o') {
      at += 2;
      list = [...list, ...sum()];
    }
    return list;
  };
  const sum = () => {
    let list = product();
    while (peek() === '+' || peek() === '-') {
      const sign = text[at] === '+' ? 1 : -1;
      at += 1;
      list = pairs(list, product(), add(sign));
    }
    return list;
  };
  const product = () => {
    let list = factor();
    for (;;) {
      const next = peek();
      if (next === '/') {
        at += 1;
        list = pairs(list, factor(), (left, right) => scale(left, 1 / right.one));
      } else if (next === '*') {
        at += 1;
        list = pairs(list, factor(), times);
      } else if (next !== '' && !'+-)o'.includes(next)) list = pairs(list, factor(), times);
      else return list;
    }
  };
  const factor = () => {
    const next = peek();
    if (next === '-' || next === '+') {
      at += 1;
      return factor().map((form) => scale(form, next === '-' ? -1 : 1));
    }
    if (next === '(') {
      at += 1;
      const list = choices();
      peek();
      at += 1;
      return list;
    }
    const digits = /^[\d.]+/.exec(text.slice(at))?.[0];
    if (digits !== undefined) {
      at += digits.length;
      return [{ one: Number(digits) }];
    }
    const symbol = symbols.find((candidate) => text.startsWith(candidate, at));
    if (symbol === undefined) throw new Error(`combination ${text} at ${String(at)}`);
    at += symbol.length;
    return [symbol in constants ? { one: constants[symbol] } : { [symbol]: 1 }];
  };
  return choices();
}

function defaultTexts(loads, f) {
  const modern = loads === 'asce7-22';
  const low = modern ? '(0.5Lr or 0.3S or 0.5R)' : '(0.5Lr or 0.5S or 0.5R)';
  const high = modern ? '(1.6Lr or 1.0S or 1.6R)' : '(1.6Lr or 1.6S or 1.6R)';
  return [
    '1.4D',
    `1.2D + 1.6L + ${low}`,
    `1.2D + ${high} + (${f}L or 0.5W)`,
    `1.2D + 1.0W + ${f}L + ${low}`,
    '0.9D + 1.0W',
    `(1.2 + 0.2SDS)D + rho E + ${f}L + ${modern ? 0.15 : 0.2}S`,
    '(0.9 - 0.2SDS)D + rho E',
  ];
}

/**
 * Every expanded combination: gravity factors, and the lateral parts with variant and signed factor, plus H. `kept` is the
 * factor of live load whose live factor stays 1.0 in the standard's own combinations.
 */
export function expandCombinations(building, basis) {
  const { settings, combinations, cases } = building;
  const constants = { SDS: settings.sds, rho: settings.rho, Omega0: settings.omega0 };
  const typed = combinations.map((row) => row.expression);
  const read = (f) => {
    const texts = typed.length > 0 ? typed : defaultTexts(settings.loads, f);
    return texts.flatMap((text) => readCombination(text, constants));
  };
  const whole = read(1);
  const service = settings.forceLevel === 'service';
  const states = {
    W: lateralStates(building, basis, 'wind'),
    E: lateralStates(building, basis, 'seismic'),
    H: cases.filter((load) => load.kind === 'other').map((load) => [{ load, variant: '0', by: 1 }]),
  };
  const level = { W: service ? 0.6 : 1, E: service ? 0.7 : 1, H: 1 };
  return read(settings.liveFactor).flatMap((form, n) => {
    let lateral = [[]];
    for (const symbol of ['W', 'E', 'H']) {
      if (!(symbol in form) || states[symbol].length === 0) continue;
      const factor = form[symbol] / level[symbol];
      const scaled = states[symbol].map((parts) => parts.map((part) => ({ ...part, by: part.by * factor })));
      lateral = lateral.flatMap((chosen) => scaled.map((parts) => [...chosen, ...parts]));
    }
    return lateral.map((parts) => ({ form, kept: whole[n].L ?? 0, parts }));
  });
}
