import { meView, resetConfirmBody, resetRequestBody, signInBody } from '@linkfell/contracts';
import type { MeView, ResetConfirmBody, ResetRequestBody, SignInBody } from '@linkfell/contracts';
import { Body, Controller, Get, Inject, Post, Req, Res, UseGuards } from '@nestjs/common';
import type { Request, Response } from 'express';

import { AccountsService } from '../accounts/accounts.service.js';
import { Public, SignedIn } from '../common/access/access.js';
import { MaybeAccount, type CurrentAccountData } from '../common/access/principal.js';
import { TightLimit } from '../common/http/rate-limit.js';
import { Answers } from '../common/validation/answers.js';
import { zod } from '../common/validation/zod.pipe.js';
import { CONFIG, type Config } from '../config/config.js';
import { AccountSessions } from './account-sessions.service.js';
import { LocalAuthGuard } from './local-auth.guard.js';
import { PasswordResets } from './password-resets.service.js';
import { cookieName, cookieOptions } from './session.middleware.js';

@Controller('auth')
export class AuthController {
  constructor(
    private readonly accounts: AccountsService,
    private readonly sessions: AccountSessions,
    private readonly resets: PasswordResets,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  @Post('sign-in')
  @Public()
  @TightLimit(30)
  @UseGuards(LocalAuthGuard)
  @Answers(meView)
  async signIn(
    @Req() request: Request & { user: { id: string } },
    @Body(zod(signInBody)) _: SignInBody,
  ): Promise<MeView> {
    await this.sessions.signIn(request, request.user.id);
    return this.accounts.me(request.user.id);
  }

  @Post('sign-out')
  @SignedIn()
  @Answers(null)
  async signOut(@Req() request: Request, @Res({ passthrough: true }) response: Response): Promise<void> {
    await this.sessions.signOut(request);
    response.clearCookie(cookieName(this.config), cookieOptions(this.config));
  }

  @Get('me')
  @Public()
  @Answers(meView)
  me(@MaybeAccount() account: CurrentAccountData | null): Promise<MeView> {
    return this.accounts.me(account?.id ?? null);
  }

  /** The same answer whether or not the address is known, and no work that depends on it. */
  @Post('password-reset')
  @Public()
  @TightLimit(10)
  @Answers(null, 202)
  async requestReset(@Body(zod(resetRequestBody)) { email }: ResetRequestBody): Promise<void> {
    await this.resets.request(email);
  }

  @Post('password-reset/confirm')
  @Public()
  @TightLimit(10)
  @Answers(null)
  async confirmReset(@Body(zod(resetConfirmBody)) { token, password }: ResetConfirmBody): Promise<void> {
    await this.resets.confirm(token, password);
  }
}
