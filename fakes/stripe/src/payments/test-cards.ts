export interface Decline {
  code: 'card_declined' | 'expired_card' | 'incorrect_cvc' | 'processing_error';
  declineCode?: string;
  message: string;
}

export interface TestCard {
  number: string;
  /** What the payment page's list says about it. */
  says: string;
  brand: 'visa' | 'mastercard';
  authenticate?: boolean;
  decline?: Decline;
  /** What becomes of a refund to it; at once unless told. */
  refund?: 'later' | 'fails';
}

const GENERIC: Decline = {
  code: 'card_declined',
  declineCode: 'generic_decline',
  message: 'Your card was declined.',
};

/** The public test cards (https://docs.stripe.com/testing) that this fake knows. */
export const TEST_CARDS: readonly TestCard[] = [
  { number: '4242424242424242', says: 'is paid', brand: 'visa' },
  { number: '5555555555554444', says: 'is paid', brand: 'mastercard' },
  { number: '4000000000000002', says: 'is declined', brand: 'visa', decline: GENERIC },
  {
    number: '4000000000009995',
    says: 'is declined for insufficient funds',
    brand: 'visa',
    decline: {
      code: 'card_declined',
      declineCode: 'insufficient_funds',
      message: 'Your card has insufficient funds.',
    },
  },
  {
    number: '4000000000000069',
    says: 'is declined as expired',
    brand: 'visa',
    decline: { code: 'expired_card', declineCode: 'expired_card', message: 'Your card has expired.' },
  },
  {
    number: '4000000000000127',
    says: 'is declined for a wrong security code',
    brand: 'visa',
    decline: {
      code: 'incorrect_cvc',
      declineCode: 'incorrect_cvc',
      message: "Your card's security code is incorrect.",
    },
  },
  {
    number: '4000000000000119',
    says: 'fails in processing',
    brand: 'visa',
    decline: {
      code: 'processing_error',
      declineCode: 'processing_error',
      message: 'An error occurred while processing your card. Try again in a little bit.',
    },
  },
  {
    number: '4000002500003155',
    says: 'asks for confirmation (3D Secure)',
    brand: 'visa',
    authenticate: true,
  },
  {
    number: '4000002760003184',
    says: 'asks for confirmation (3D Secure)',
    brand: 'visa',
    authenticate: true,
  },
  {
    number: '4000008400001629',
    says: 'asks for confirmation, then is declined',
    brand: 'visa',
    authenticate: true,
    decline: GENERIC,
  },
  {
    number: '4000000000007726',
    says: 'is paid; a refund to it takes a moment',
    brand: 'visa',
    refund: 'later',
  },
  { number: '4000000000005126', says: 'is paid; a refund to it fails later', brand: 'visa', refund: 'fails' },
];

/** Public payment method names that stand for a test card. */
const METHOD_NAMES: Readonly<Record<string, string>> = {
  pm_card_visa: '4242424242424242',
  pm_card_mastercard: '5555555555554444',
  pm_card_visa_chargeDeclined: '4000000000000002',
  pm_card_chargeDeclined: '4000000000000002',
  pm_card_visa_chargeDeclinedInsufficientFunds: '4000000000009995',
  pm_card_chargeDeclinedInsufficientFunds: '4000000000009995',
  pm_card_authenticationRequired: '4000002760003184',
  pm_card_pendingRefund: '4000000000007726',
  pm_card_refundFail: '4000000000005126',
};

const NOT_A_TEST_CARD: Decline = {
  code: 'card_declined',
  declineCode: 'test_mode_live_card',
  message: 'Your card was declined. Your request was in test mode, but used a non test card.',
};

/** The rule for a number; a card that is not on the list is declined, as in the service's test mode. */
export function cardFor(number: string): TestCard {
  const known = TEST_CARDS.find((card) => card.number === number);
  return known ?? { number, says: 'is not a test card', brand: 'visa', decline: NOT_A_TEST_CARD };
}

/** The card number behind a public test payment method, or undefined. */
export function numberOfMethod(name: string): string | undefined {
  return METHOD_NAMES[name];
}

/** The check digit of a card number (ISO/IEC 7812-1, annex B). */
export function hasValidCheckDigit(number: string): boolean {
  const sum = [...number].reverse().reduce((total, digit, index) => {
    const value = Number(digit) * (index % 2 === 1 ? 2 : 1);
    return total + (value > 9 ? value - 9 : value);
  }, 0);
  return /^\d{12,19}$/.test(number) && sum % 10 === 0;
}
