import { randomBytes, scryptSync } from 'node:crypto';

/** A hash the server can check, at the least cost scrypt knows: the cost is written in the hash, and tests sign in often. */
export const cheapHash = (secret: string | Buffer): string => {
  const [N, r, p] = [2, 1, 1];
  const salt = randomBytes(16);
  const key = scryptSync(secret, salt, 32, { N, r, p });
  return ['scrypt', N, r, p, salt.toString('base64'), key.toString('base64')].join('$');
};
