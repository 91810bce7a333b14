import type { Request } from 'express';
import { RateLimiterMemory } from 'rate-limiter-flexible';
import { Refusal } from '../../lib/problem';

/** Attempts a minute, counted by address and by account, so that neither guessing nor spraying pays. */
export class SignInLimit {
  private readonly byAddress: RateLimiterMemory;
  private readonly byAccount: RateLimiterMemory;

  constructor(attemptsAMinute: number) {
    this.byAddress = new RateLimiterMemory({ points: attemptsAMinute * 3, duration: 60 });
    this.byAccount = new RateLimiterMemory({ points: attemptsAMinute, duration: 60 });
  }

  async take(request: Request, email: string): Promise<void> {
    try {
      await this.byAddress.consume(request.ip ?? 'unknown');
      await this.byAccount.consume(email.trim().toLowerCase());
    } catch {
      throw new Refusal(429, 'too-many-attempts', 'Too many attempts', 'Wait a minute, then try again.', {
        retryAfterSeconds: 60,
      });
    }
  }
}
