import { parseOptions } from '@node-rs/argon2';
import { describe, expect, it } from 'vitest';
import { hashPassword, isCommonPassword, verifyPassword } from '@/lib/auth/passwords';

describe('passwords', () => {
  it('are kept as Argon2id with the stated cost, never the same way twice', async () => {
    const kept = await hashPassword('larch water evening');
    expect(kept).toMatch(/^\$argon2id\$/);
    expect(parseOptions(kept)).toMatchObject({ memoryCost: 19_456, timeCost: 2, parallelism: 1, outputLen: 32 });
    expect(await hashPassword('larch water evening')).not.toBe(kept);
  });

  it('match however the keyboard composed their accents', async () => {
    const kept = await hashPassword('me\u0301lèze du soir');
    expect(await verifyPassword(kept, 'm\u00e9lèze du soir')).toBe(true);
    expect(await verifyPassword(kept, 'meleze du soir')).toBe(false);
  });

  it('take as long to refuse for an unknown e-mail as for a wrong password', async () => {
    const kept = await hashPassword('larch water evening');
    await verifyPassword(null, 'warm up');
    const time = async (hash: string | null) => {
      const start = performance.now();
      expect(await verifyPassword(hash, 'something else')).toBe(false);
      return performance.now() - start;
    };
    // The quickest of several in turn: the machine may be busy with something else in any of them.
    const times = { unknown: [] as number[], wrong: [] as number[] };
    for (let round = 0; round < 7; round += 1) {
      times.unknown.push(await time(null));
      times.wrong.push(await time(kept));
    }
    const [unknown, wrong] = [Math.min(...times.unknown), Math.min(...times.wrong)];
    expect(unknown).toBeGreaterThan(wrong / 3);
    expect(unknown).toBeLessThan(wrong * 3);
  });

  it('that are tried first are known, in capitals too', () => {
    expect(isCommonPassword('Qwertyuiop')).toBe(true);
    expect(isCommonPassword('larch water evening')).toBe(false);
  });
});
