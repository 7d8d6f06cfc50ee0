import { Injectable, Logger } from '@nestjs/common';
import { PassportStrategy } from '@nestjs/passport';
import type { Request } from 'express';
import { Strategy } from 'passport-local';

import { AccountsService } from '../accounts/accounts.service.js';
import { passwordMatches } from '../accounts/passwords.js';
import { AuthException } from './auth.exception.js';
import { SignInLimiter } from './sign-in-limiter.service.js';

/** E-mail address and password. A wrong password and an unknown address look and last the same. */
@Injectable()
export class LocalStrategy extends PassportStrategy(Strategy) {
  private readonly logger = new Logger('SignIn');

  constructor(
    private readonly accounts: AccountsService,
    private readonly limiter: SignInLimiter,
  ) {
    super({ usernameField: 'email', passwordField: 'password', session: false, passReqToCallback: true });
  }

  async validate(request: Request, email: string, password: string): Promise<{ id: string }> {
    const attempt = await this.limiter.begin(email, request.ip ?? '');
    const account = await this.accounts.findByEmail(email);
    const matches = await passwordMatches(account?.passwordHash ?? null, password);
    if (!account || !matches) {
      this.logger.warn({ event: 'sign-in-refused', email, requestId: request.id }, 'sign-in refused');
      throw new AuthException('wrong-credentials');
    }
    await this.limiter.succeeded(attempt);
    this.logger.log({ event: 'signed-in', accountId: account.id, requestId: request.id }, 'signed in');
    return { id: account.id };
  }
}
