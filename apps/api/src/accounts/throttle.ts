import { Injectable } from '@nestjs/common';
import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';
import { ProblemException } from '../common/problems';
import { SessionPool } from '../database/session-pool';

const MINUTES = 15;

/** Counts tries in PostgreSQL, so that any number of processes count together. */
@Injectable()
export class Throttle {
  private readonly perAddress: RateLimiterPostgres;
  private readonly perAccount: RateLimiterPostgres;
  private readonly perToken: RateLimiterPostgres;

  constructor({ pool }: SessionPool) {
    const limiter = (keyPrefix: string, points: number) =>
      new RateLimiterPostgres({
        storeClient: pool,
        storeType: 'pool',
        tableName: 'sign_in_throttle',
        tableCreated: true,
        keyPrefix,
        points,
        duration: MINUTES * 60,
      });
    this.perAddress = limiter('address', 100);
    this.perAccount = limiter('account', 10);
    this.perToken = limiter('token', 1800);
  }

  /** Counts one try from `ip` at `email`. @throws 429 when there were too many. */
  async count(ip: string, email: string): Promise<void> {
    await this.consume(this.perAddress, ip);
    await this.consume(this.perAccount, email.toLowerCase());
  }

  /** Counts a call from `ip` with a token that opens nothing. @throws 429 when there were too many. */
  countStranger(ip: string): Promise<void> {
    return this.consume(this.perAddress, ip);
  }

  /** Counts one call with an API token: two a second on average. @throws 429 when there were too many. */
  countCall(tokenId: string): Promise<void> {
    return this.consume(this.perToken, tokenId);
  }

  private async consume(limiter: RateLimiterPostgres, key: string): Promise<void> {
    try {
      await limiter.consume(key);
    } catch (refused) {
      if (!(refused instanceof RateLimiterRes)) throw refused;
      const minutes = Math.ceil(refused.msBeforeNext / 60_000);
      throw new ProblemException(
        429,
        'Too many tries',
        `Too many tries. Wait ${minutes} minutes and try again.`,
      );
    }
  }

  /** Forgets the tries at `email`, after one that succeeded. */
  async forget(email: string): Promise<void> {
    await this.perAccount.delete(email.toLowerCase());
  }
}
