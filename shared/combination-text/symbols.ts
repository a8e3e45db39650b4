/** Loads of ASCE 7 2.2 that a combination may name, in the order in which factors are listed. */
export const loadSymbols = ['D', 'L', 'Lr', 'S', 'R', 'W', 'E', 'H', 'F', 'T'] as const;
export type LoadSymbol = (typeof loadSymbols)[number];

/** Numbers of the building that a combination may name: ASCE 7 11.4.5, 12.3.4 and Table 12.2-1. */
export const constantSymbols = ['SDS', 'rho', 'Omega0'] as const;
export type ConstantSymbol = (typeof constantSymbols)[number];

export type CombinationConstants = Readonly<Record<ConstantSymbol, number>>;
export type LoadFactors = Readonly<Record<LoadSymbol, number>>;

/** Longest first, so that `SDS` is never read as `S` times something and `Lr` never as `L`. */
export const symbolsLongestFirst: readonly (LoadSymbol | ConstantSymbol)[] = [...constantSymbols, ...loadSymbols].sort(
  (a, b) => b.length - a.length,
);

export const isLoadSymbol = (name: string): name is LoadSymbol => (loadSymbols as readonly string[]).includes(name);
export const isConstantSymbol = (name: string): name is ConstantSymbol =>
  (constantSymbols as readonly string[]).includes(name);
