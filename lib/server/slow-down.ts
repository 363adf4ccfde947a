import 'server-only';
import { RateLimiterMemory, RateLimiterRes } from 'rate-limiter-flexible';

const quarterHourSeconds = 15 * 60;

/**
 * Tries in a quarter of an hour. The first limit is for who guesses from one place, and leaves the person themselves in
 * from another; the second for who guesses from many places; the third for who goes through many accounts.
 */
const limiters = {
  accountFromAddress: new RateLimiterMemory({ keyPrefix: 'account-from-address', points: 5, duration: quarterHourSeconds }),
  account: new RateLimiterMemory({ keyPrefix: 'account', points: 30, duration: quarterHourSeconds }),
  address: new RateLimiterMemory({ keyPrefix: 'address', points: 50, duration: quarterHourSeconds }),
};

type Try = { readonly email: string; readonly address: string };

const keysOf = ({ email, address }: Try): Readonly<Record<keyof typeof limiters, string>> => ({ accountFromAddress: JSON.stringify([email, address]), account: email, address });

/** Seconds to wait; 0 when this one may still be made. */
const consume = async (limiter: RateLimiterMemory, key: string): Promise<number> => {
  try {
    await limiter.consume(key);
    return 0;
  } catch (error) {
    if (error instanceof RateLimiterRes) return Math.ceil(error.msBeforeNext / 1000);
    throw error;
  }
};

/**
 * Counts a try before its password is looked at, so that tries sent all at once count as well.
 *
 * @returns seconds to wait before a password is looked at; 0 when this one may be
 */
export const countTry = async (made: Try): Promise<number> => {
  const keys = keysOf(made);
  const waits = await Promise.all([
    consume(limiters.accountFromAddress, keys.accountFromAddress), consume(limiters.account, keys.account), consume(limiters.address, keys.address),
  ]);
  return Math.max(...waits);
};

/** The right password was no guess: it does not count, and the wrong ones before it from there are forgotten. */
export const forgiveTries = async (made: Try): Promise<void> => {
  const keys = keysOf(made);
  await Promise.all([limiters.accountFromAddress.delete(keys.accountFromAddress), limiters.account.reward(keys.account), limiters.address.reward(keys.address)]);
};
