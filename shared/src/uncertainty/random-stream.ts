const WORDS = 4;
const TWO_TO_32 = 4294967296;

/**
 * The state of a random stream of its own for each name: numbers of one stream do not change when others come or go, so
 * an entry keeps its samples whatever stands beside it. The name is spread over 128 bits by four multiply-and-rotate
 * lanes with a finaliser each; equal seed and name give the equal stream.
 * @param seed whole number of 0 and more; its lowest 53 bits count
 */
export function randomStream(seed: number, name: string): Uint32Array {
  const state = new Uint32Array(WORDS);
  const low = seed >>> 0;
  const high = Math.floor(seed / TWO_TO_32) >>> 0;
  for (let lane = 0; lane < WORDS; lane += 1) {
    let h = mixed(Math.imul(lane + 1, 0x9e3779b9) ^ low);
    h = mixed(h ^ high);
    for (let i = 0; i < name.length; i += 1) h = mixed(h ^ name.charCodeAt(i));
    state[lane] = h;
  }
  // All zeros is the one state the generator never leaves.
  if (state.every((word) => word === 0)) state[0] = 1;
  return state;
}

/** Finaliser of MurmurHash3, one to one on 32 bits. */
function mixed(word: number): number {
  let h = word;
  h = Math.imul(h ^ (h >>> 16), 0x85ebca6b);
  h = Math.imul(h ^ (h >>> 13), 0xc2b2ae35);
  return (h ^ (h >>> 16)) >>> 0;
}

/**
 * The next numbers of a stream, each strictly between 0 and 1: (n + ½)/2³² with n from xoshiro128** 1.1 (D. Blackman and
 * S. Vigna, Scrambled linear pseudorandom number generators, ACM TOMS 47 (2021); public domain). Whole-number arithmetic
 * only, so every machine gives the same. How many are taken at once makes no difference.
 * @param state moves on
 * @param count how many of `out` to fill
 */
export function fillUniform(state: Uint32Array, out: Float64Array, count: number): void {
  let s0 = state[0]! | 0;
  let s1 = state[1]! | 0;
  let s2 = state[2]! | 0;
  let s3 = state[3]! | 0;
  for (let i = 0; i < count; i += 1) {
    const five = Math.imul(s1, 5);
    const n = Math.imul((five << 7) | (five >>> 25), 9);
    out[i] = ((n >>> 0) + 0.5) / TWO_TO_32;
    const t = s1 << 9;
    s2 ^= s0;
    s3 ^= s1;
    s1 ^= s2;
    s0 ^= s3;
    s2 ^= t;
    s3 = (s3 << 11) | (s3 >>> 21);
  }
  state[0] = s0;
  state[1] = s1;
  state[2] = s2;
  state[3] = s3;
}
