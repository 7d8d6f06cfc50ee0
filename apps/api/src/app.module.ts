import { Module, type DynamicModule } from '@nestjs/common';
import { APP_FILTER, APP_GUARD, APP_INTERCEPTOR } from '@nestjs/core';

import { AuthModule } from './auth/auth.module.js';
import { AccessGuard } from './common/access/access.guard.js';
import { AccessModule } from './common/access/access.module.js';
import { CommonModule } from './common/common.module.js';
import { CsrfGuard } from './common/csrf/csrf.guard.js';
import { RateLimitGuard, rateLimitModule } from './common/http/rate-limit.js';
import { loggingModule } from './common/logging/logging.module.js';
import { OpenApiModule } from './common/openapi/openapi.module.js';
import { ProblemFilter } from './common/problems/problem.filter.js';
import { AnswersInterceptor } from './common/validation/answers.js';
import { ConfigModule } from './config/config.module.js';
import type { Config } from './config/config.js';
import { databaseModule } from './database/database.module.js';
import { HealthModule } from './health/health.module.js';
import { HousekeepingModule } from './housekeeping/housekeeping.module.js';
import { NotificationsModule } from './notifications/notifications.module.js';
import { OutboxModule } from './outbox/outbox.module.js';
import { CheckoutModule } from './checkout/checkout.module.js';
import { BookingsModule } from './fitting-bookings/bookings.module.js';
import { FramesModule } from './frames/frames.module.js';
import { MatchesModule } from './matches/matches.module.js';
import { MeasureUpsModule } from './measure-ups/measure-ups.module.js';
import { OrdersModule } from './orders/orders.module.js';
import { PaymentsModule } from './payments/payments.module.js';
import { PlansModule } from './plans/plans.module.js';
import { StockModule } from './stock/stock.module.js';

@Module({})
export class AppModule {
  /** The whole application for one configuration; tests boot this very module. */
  static with(config: Config): DynamicModule {
    return {
      module: AppModule,
      imports: [
        ConfigModule.with(config),
        loggingModule(config),
        databaseModule(config),
        rateLimitModule(),
        CommonModule,
        AccessModule,
        OutboxModule,
        NotificationsModule,
        AuthModule,
        FramesModule,
        MeasureUpsModule,
        MatchesModule,
        PlansModule,
        CheckoutModule,
        PaymentsModule,
        OrdersModule,
        BookingsModule,
        StockModule,
        OpenApiModule,
        HousekeepingModule,
        HealthModule,
      ],
      providers: [
        // In this order: count the request, see that it is our own page's, then who may.
        { provide: APP_GUARD, useClass: RateLimitGuard },
        { provide: APP_GUARD, useClass: CsrfGuard },
        { provide: APP_GUARD, useClass: AccessGuard },
        { provide: APP_INTERCEPTOR, useClass: AnswersInterceptor },
        { provide: APP_FILTER, useClass: ProblemFilter },
      ],
    };
  }
}
