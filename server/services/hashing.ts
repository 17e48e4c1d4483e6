import { createHash, createHmac, randomBytes, scrypt, timingSafeEqual } from 'node:crypto';

/** Cost of scrypt: N = 2^15, r = 8, p = 1 (about 90 ms on a small server), with room for its memory. */
const cost = { N: 2 ** 15, r: 8, p: 1, maxmem: 64 * 1024 * 1024 };
const keyLength = 32;

const derive = (
  secret: string | Buffer,
  salt: Buffer,
  { N, r, p }: { N: number; r: number; p: number },
): Promise<Buffer> =>
  new Promise((resolve, reject) => {
    scrypt(secret, salt, keyLength, { N, r, p, maxmem: cost.maxmem }, (error, key) =>
      error ? reject(error) : resolve(key),
    );
  });

/** Hashes a secret with scrypt and a salt of its own; the cost is kept in the text so that it can be raised later. */
export const hashSecret = async (secret: string | Buffer): Promise<string> => {
  const salt = randomBytes(16);
  const key = await derive(secret, salt, cost);
  return ['scrypt', cost.N, cost.r, cost.p, salt.toString('base64'), key.toString('base64')].join('$');
};

/** Whether a secret is the one that was hashed; compares in constant time. */
export const verifySecret = async (secret: string | Buffer, stored: string): Promise<boolean> => {
  const [, N, r, p, salt = '', key = ''] = stored.split('$');
  const expected = Buffer.from(key, 'base64');
  const actual = await derive(secret, Buffer.from(salt, 'base64'), {
    N: Number(N),
    r: Number(r),
    p: Number(p),
  });
  return expected.length === actual.length && timingSafeEqual(expected, actual);
};

/** Mixes the server's pepper into a PIN, so that a stolen database alone does not give the PINs away. */
export const pepperedPin = (pin: string, pepper: string): Buffer =>
  createHmac('sha256', pepper).update(pin).digest();

/** Hash of a random token or one-time code for looking it up; the token itself is never stored. */
export const hashToken = (token: string): string => createHash('sha256').update(token).digest('hex');
