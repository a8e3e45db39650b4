import { formatNumber, thinSpace } from './number.ts';

/** A drift as percent of the height, three decimals and a thin space; −0 reads 0. */
export const formatDrift = (ratio: number): string => `${formatNumber(ratio * 100, 3)}${thinSpace}%`;
