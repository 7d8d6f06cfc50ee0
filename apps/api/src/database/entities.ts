import { Account } from '../accounts/account.entity.js';
import { PasswordReset } from '../auth/password-reset.entity.js';
import { Session } from '../auth/session.entity.js';
import { SignInAttempt } from '../auth/sign-in-attempt.entity.js';
import { IdempotencyKey } from '../common/idempotency/idempotency-key.entity.js';
import { Booking } from '../fitting-bookings/booking.entity.js';
import { FittingRecord } from '../fitting-bookings/fitting-record.entity.js';
import { FrameSheetEntry } from '../frames/frame-sheet-entry.entity.js';
import { FrameSheet } from '../frames/frame-sheet.entity.js';
import { Frame } from '../frames/frame.entity.js';
import { Maker } from '../frames/maker.entity.js';
import { Listing } from '../listings/listing.entity.js';
import { StockMovement } from '../listings/stock-movement.entity.js';
import { MeasureUpAnswer } from '../measure-ups/measure-up-answer.entity.js';
import { MeasureUpLink } from '../measure-ups/measure-up-link.entity.js';
import { MeasureUp } from '../measure-ups/measure-up.entity.js';
import { MailLog } from '../notifications/mail-log.entity.js';
import { OrderLine } from '../orders/order-line.entity.js';
import { Order } from '../orders/order.entity.js';
import { Parcel } from '../orders/parcel.entity.js';
import { OrganisationMember } from '../organisations/organisation-member.entity.js';
import { Organisation } from '../organisations/organisation.entity.js';
import { Town } from '../organisations/town.entity.js';
import { OutboxMessage } from '../outbox/outbox-message.entity.js';
import { Payment } from '../payments/payment.entity.js';
import { Refund } from '../payments/refund.entity.js';
import { StripeEvent } from '../payments/stripe-event.entity.js';
import { Plan } from '../plans/plan.entity.js';
import { CatalogueItem } from '../shocks/catalogue-item.entity.js';
import { CoilSpring } from '../shocks/coil-spring.entity.js';
import { HardwareKit } from '../shocks/hardware-kit.entity.js';
import { HoldOpenPart } from '../shocks/hold-open-part.entity.js';
import { Remote } from '../shocks/remote.entity.js';
import { ShockModel } from '../shocks/shock-model.entity.js';
import { ShockSize } from '../shocks/shock-size.entity.js';
import { Stand } from '../workshops/stand.entity.js';
import { WorkshopClosure } from '../workshops/workshop-closure.entity.js';
import { WorkshopHours } from '../workshops/workshop-hours.entity.js';
import { WorkshopService } from '../workshops/workshop-service.entity.js';

/** Every table of the schema. */
export const entities = [
  Account,
  PasswordReset,
  Session,
  SignInAttempt,
  IdempotencyKey,
  Booking,
  FittingRecord,
  FrameSheetEntry,
  FrameSheet,
  Frame,
  Maker,
  Listing,
  StockMovement,
  MeasureUpAnswer,
  MeasureUpLink,
  MeasureUp,
  MailLog,
  OrderLine,
  Order,
  Parcel,
  OrganisationMember,
  Organisation,
  Town,
  OutboxMessage,
  Payment,
  Refund,
  StripeEvent,
  Plan,
  CatalogueItem,
  CoilSpring,
  HardwareKit,
  HoldOpenPart,
  Remote,
  ShockModel,
  ShockSize,
  Stand,
  WorkshopClosure,
  WorkshopHours,
  WorkshopService,
];
