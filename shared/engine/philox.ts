/**
 * Philox4x32-10: four 32-bit random words for a counter and a key, by ten rounds of multiplication and exchange. As
 * there is no state to carry on, draw i is the same whoever computes it, and in what order.
 * Source: Salmon, Moraes, Dror & Shaw, Parallel random numbers: as easy as 1, 2, 3 (SC 2011). Its published test
 * vectors are among the tests. Cost: some 50 ns.
 */
export function philox(
  counter: readonly [number, number, number, number],
  key: readonly [number, number],
  words: Uint32Array,
): void {
  let [c0, c1, c2, c3] = counter;
  let [k0, k1] = key;
  for (let round = 0; round < 10; round++) {
    const high0 = highProduct(0xd2511f53, c0);
    const low0 = Math.imul(0xd2511f53, c0);
    const high1 = highProduct(0xcd9e8d57, c2);
    const low1 = Math.imul(0xcd9e8d57, c2);
    c0 = high1 ^ c1 ^ k0;
    c1 = low1;
    c2 = high0 ^ c3 ^ k1;
    c3 = low0;
    k0 = (k0 + 0x9e3779b9) | 0;
    k1 = (k1 + 0xbb67ae85) | 0;
  }
  words[0] = c0;
  words[1] = c1;
  words[2] = c2;
  words[3] = c3;
}

/** Upper 32 bits of the product of two 32-bit numbers. */
function highProduct(a: number, b: number): number {
  const aLow = a & 0xffff;
  const aHigh = a >>> 16;
  const bLow = b & 0xffff;
  const bHigh = b >>> 16;
  const low = aLow * bLow;
  const middle = aHigh * bLow + (low >>> 16);
  const cross = aLow * bHigh + (middle % 0x10000);
  return aHigh * bHigh + Math.floor(middle / 0x10000) + Math.floor(cross / 0x10000);
}

/** A number within 0 to 1, neither of them, from two words: 52 bits, each number in the middle of its cell. */
export function uniformOf(high: number, low: number): number {
  return ((high >>> 6) * 67_108_864 + (low >>> 6) + 0.5) / 4_503_599_627_370_496;
}
