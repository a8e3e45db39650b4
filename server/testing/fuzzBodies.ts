/** Mulberry32: the same bodies in every run. */
export function seededRandom(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = state;
    mixed = Math.imul(mixed ^ (mixed >>> 15), mixed | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296;
  };
}

const oddValues: readonly unknown[] = [
  ...[null, true, 0, -0, -1, 1e308, 5e-324, 1e12, 1e13, 0.1, 9_007_199_254_740_992],
  ...['', ' ', '=1+1', 'x'.repeat(501), '__proto__', 'constructor', '\ud800', 'é', '\u202e', '"', '<b>', 'Roof', '12'],
  ...[[], {}, [[]], [null], { a: 1 }],
];
const oddKeys = ['x', '__proto__', 'constructor', 'toString', 'id', 'version', 'thickness'];

/** Valid bodies made slightly wrong, or odd, or not at all. */
export class Mutator {
  constructor(private readonly random: () => number) {}

  chance(share: number): boolean {
    return this.random() < share;
  }

  pick<T>(list: readonly [T, ...T[]] | readonly T[]): T {
    const one = list[Math.floor(this.random() * list.length)];
    if (one === undefined) throw new RangeError('nothing to pick from');
    return one;
  }

  mutate(value: unknown): unknown {
    if (this.chance(0.1)) return this.pick(oddValues.map((odd) => ({ odd }))).odd;
    if (typeof value === 'number')
      return this.pick([value, value, value * 2, -value, value + 1, value / 3, value * 1e6]);
    if (typeof value === 'string') return this.pick([value, value, `${value}x`, value.slice(1), value.toUpperCase()]);
    if (Array.isArray(value)) return value.map((inner: unknown) => (this.chance(0.3) ? this.mutate(inner) : inner));
    if (typeof value !== 'object' || value === null) return value;
    const entries = Object.entries(value)
      .filter(() => !this.chance(0.05))
      .map(([key, inner]): [string, unknown] => [key, this.chance(0.25) ? this.mutate(inner) : inner]);
    if (this.chance(0.05)) entries.push([this.pick(oddKeys), this.pick(['x', '12', 'Roof'])]);
    return Object.fromEntries(entries);
  }

  /** A file with up to three characters replaced, added or lost. */
  mutateText(text: string): string {
    let result = text;
    for (let times = Math.floor(this.random() * 4); times > 0; times -= 1) {
      const at = Math.floor(this.random() * result.length);
      const put = this.pick(['', ',', '\n', '"', ';', '9', '-', '\t', ' ', '1e9', 'é', 'Roof']);
      result = result.slice(0, at) + put + result.slice(at + Math.floor(this.random() * 3));
    }
    return result;
  }
}
