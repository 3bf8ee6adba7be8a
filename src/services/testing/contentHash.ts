import { createHash } from 'node:crypto';

/** What a recording is, whatever file it came in: its subject and its samples. Serves to know it again. */
export function contentHash(parts: readonly (string | number)[], samples: readonly ArrayLike<number>[]): Buffer {
  const hash = createHash('sha256').update(parts.join('\n'));
  for (const channel of samples) hash.update(packSamples(channel));
  return hash.digest();
}

/** Samples as little-endian 32-bit floats. */
export function packSamples(samples: ArrayLike<number>): Buffer {
  const packed = Buffer.alloc(samples.length * 4);
  for (let i = 0; i < samples.length; i += 1) packed.writeFloatLE(samples[i]!, i * 4);
  return packed;
}
