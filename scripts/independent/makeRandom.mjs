/** A small multiply-with-carry style generator: the same seed gives the same building on every machine. */
export function makeRandom(seed) {
  let state = (seed * 2654435761 + 1013904223) >>> 0;
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    let mixed = state;
    mixed = Math.imul(mixed ^ (mixed >>> 15), 2246822519) >>> 0;
    mixed = (mixed ^ (mixed >>> 13)) >>> 0;
    return mixed / 4294967296;
  };
}
