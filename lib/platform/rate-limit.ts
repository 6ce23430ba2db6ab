import "server-only";
import { RateLimiterMemory, RateLimiterRes } from "rate-limiter-flexible";
import { AppError } from "./errors";

/** Tries at signing in: per address and account, per account, and per address over all accounts. */
const signInPerPair = new RateLimiterMemory({ points: 8, duration: 15 * 60 });
const signInPerAccount = new RateLimiterMemory({ points: 40, duration: 15 * 60 });
const signInPerAddress = new RateLimiterMemory({ points: 60, duration: 15 * 60 });
const signUpPerAddress = new RateLimiterMemory({ points: 20, duration: 60 * 60 });

async function take(limiter: RateLimiterMemory, key: string): Promise<void> {
  try {
    await limiter.consume(key);
  } catch (refusal) {
    if (!(refusal instanceof RateLimiterRes)) throw refusal;
    const seconds = Math.max(1, Math.ceil(refusal.msBeforeNext / 1000));
    throw new AppError("too_many", {
      message: `Too many tries. Wait ${seconds < 90 ? `${seconds} seconds` : `${Math.ceil(seconds / 60)} minutes`}.`,
      headers: { "Retry-After": String(seconds) },
    });
  }
}

export async function limitSignIn(address: string, email: string): Promise<void> {
  await take(signInPerAddress, address);
  await take(signInPerAccount, email);
  await take(signInPerPair, `${address} ${email}`);
}

/** A right password clears the count of wrong ones. */
export async function forgiveSignIn(address: string, email: string): Promise<void> {
  await signInPerPair.delete(`${address} ${email}`);
}

export async function limitSignUp(address: string): Promise<void> {
  await take(signUpPerAddress, address);
}
