import { Module } from '@nestjs/common';
import { PassportModule } from '@nestjs/passport';

import { AccountsModule } from '../accounts/accounts.module.js';
import { NotificationsModule } from '../notifications/notifications.module.js';
import { AccountSessions } from './account-sessions.service.js';
import { AuthController } from './auth.controller.js';
import { LocalStrategy } from './local.strategy.js';
import { PasswordResets } from './password-resets.service.js';
import { SignInLimiter } from './sign-in-limiter.service.js';

@Module({
  imports: [PassportModule, AccountsModule, NotificationsModule],
  controllers: [AuthController],
  providers: [AccountSessions, LocalStrategy, PasswordResets, SignInLimiter],
})
export class AuthModule {}
