import 'server-only';
import { RateLimiterMemory, RateLimiterRes } from 'rate-limiter-flexible';

/** Wrong passwords: five for one account in a quarter of an hour, fifty from one address. */
const perAccount = new RateLimiterMemory({ keyPrefix: 'account', points: 5, duration: 15 * 60 });
const perAddress = new RateLimiterMemory({ keyPrefix: 'address', points: 50, duration: 15 * 60 });

const accountKey = (email: string): string => email.trim().toLowerCase().slice(0, 254);

/** Seconds to wait before another try is looked at; 0 when it may be made now. */
export const secondsToWait = async (email: string, address: string): Promise<number> => {
  const states = await Promise.all([perAccount.get(accountKey(email)), perAddress.get(address)]);
  const [account, from] = states;
  const waits = [account !== null && account.consumedPoints >= perAccount.points ? account.msBeforeNext : 0, from !== null && from.consumedPoints >= perAddress.points ? from.msBeforeNext : 0];
  return Math.ceil(Math.max(...waits) / 1000);
};

const countOne = async (limiter: RateLimiterMemory, key: string): Promise<void> => {
  try {
    await limiter.consume(key);
  } catch (error) {
    if (!(error instanceof RateLimiterRes)) throw error;
  }
};

export const countWrongPassword = async (email: string, address: string): Promise<void> => {
  await Promise.all([countOne(perAccount, accountKey(email)), countOne(perAddress, address)]);
};

export const forgetWrongPasswords = async (email: string): Promise<void> => {
  await perAccount.delete(accountKey(email));
};
