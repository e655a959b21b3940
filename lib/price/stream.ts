/**
 * A stream of uniform numbers in (0, 1) that belongs to a seed and a name: adding or removing one stream never changes
 * another. Generator sfc32 (Doty-Humphrey, PractRand), its state filled by the FNV-1a hash of the name mixed with the
 * seed, the first rounds thrown away. `seed` is taken as an integer.
 */
export function uniformStream(seed: number, name: string): () => number {
  let hash = 0x811c9dc5;
  for (let i = 0; i < name.length; i++) hash = Math.imul(hash ^ name.charCodeAt(i), 0x01000193);
  let a = hash | 0;
  let b = seed | 0;
  let c = Math.floor(seed / 4294967296) | 0;
  let counter = 1;
  const next = (): number => {
    const t = (((a + b) | 0) + counter) | 0;
    counter = (counter + 1) | 0;
    a = b ^ (b >>> 9);
    b = (c + (c << 3)) | 0;
    c = (c << 21) | (c >>> 11);
    c = (c + t) | 0;
    return t >>> 0;
  };
  for (let i = 0; i < warmUp; i++) next();
  // 32 bits, put in the middle of their step so that 0 and 1 never come.
  return () => (next() + 0.5) / 4294967296;
}

const warmUp = 15;
