import { rateLimit } from 'express-rate-limit';
import { AppError } from '../errors.ts';

const perMinute = (limit: number, sentence: string) =>
  rateLimit({
    windowMs: 60_000,
    limit,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    handler: () => {
      throw new AppError('too-many-requests', sentence, { retryAfterS: 60 });
    },
  });

/** Slows down a logger that sends far more often than anything melts: four deliveries a second, from one address. */
export const limitReadings = () =>
  perMinute(240, 'Too many deliveries from this address. Send readings in batches, and wait a minute.');

/** Slows down whoever tries sign-ins or codes from one address. */
export const limitSignIns = () =>
  perMinute(60, 'Too many tries from this address. Wait a minute and try again.');
