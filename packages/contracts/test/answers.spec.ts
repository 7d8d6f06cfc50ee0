import { describe, expect, it } from 'vitest';

import {
  checkoutBody,
  putAnswerBody,
  questionKeys,
  questionOrder,
  questionSchemas,
  steps,
} from '../src/index.js';

const faults = (key: (typeof questionKeys)[number], value: unknown): string[] => {
  const parsed = putAnswerBody(key).safeParse({ state: 'known', value });
  return parsed.success ? [] : parsed.error.issues.map(({ path }) => path.join('/'));
};

describe('the questions of the measure-up', () => {
  it('are each asked once, in the order of the steps', () => {
    expect(questionOrder.map(({ key }) => key).sort()).toEqual([...questionKeys].sort());
    const places = questionOrder.map(({ step }) => steps.indexOf(step));
    expect(places).toEqual([...places].sort((a, b) => a - b));
  });

  it.each(questionKeys)('%s takes "I don’t know" and nothing beside it', (key) => {
    expect(putAnswerBody(key).safeParse({ state: 'unknown' }).success).toBe(true);
    expect(putAnswerBody(key).safeParse({ state: 'unknown', value: {} }).success).toBe(false);
    expect(putAnswerBody(key).safeParse({ state: 'known' }).success).toBe(false);
  });

  it.each(questionKeys)('%s refuses what it does not know', (key) => {
    expect(questionSchemas[key].safeParse({ surprise: true }).success).toBe(false);
  });

  it('points at the figure that is wrong', () => {
    expect(faults('weight', { riderKg: 900, kitKg: 3 })).toEqual(['value/riderKg']);
    expect(faults('eye-to-eye', { mm: 21, tool: 'caliper', awkward: false })).toEqual(['value/mm']);
    expect(faults('stroke', { method: 'shaft', reading: { mm: 500, tool: 'tape', awkward: false } })).toEqual(
      ['value/reading/mm'],
    );
    expect(faults('frame-end', { kind: 'hardware', widthMm: 30, boltMm: 80, tool: 'ruler' })).toEqual([
      'value/boltMm',
    ]);
    expect(faults('weight', { riderKg: Number.NaN, kitKg: 3 })).toEqual(['value/riderKg']);
  });

  it('lets a figure of the frame be unknown by itself', () => {
    expect(faults('link-end', { kind: 'pin', diameterMm: null, widthMm: 22, tool: 'caliper' })).toEqual([]);
  });
});

describe('checkout', () => {
  const good = {
    contact: {
      name: ' Wren Hollis ',
      email: 'Wren@Rider.Example',
      phone: '01632 960123',
      street: '1 Beck Lane',
      town: 'Skelhow',
      postcode: 'QF1 9ZZ',
    },
    acceptTerms: true,
    totalMinor: 43800,
  };

  it('trims names and writes addresses small', () => {
    expect(checkoutBody.parse(good).contact).toMatchObject({
      name: 'Wren Hollis',
      email: 'wren@rider.example',
    });
  });

  it.each([
    ['no terms', { ...good, acceptTerms: false }, 'acceptTerms'],
    [
      'a header smuggled into the name',
      { ...good, contact: { ...good.contact, name: 'W\r\nBcc: x@y.example' } },
      'contact/name',
    ],
    ['no address', { ...good, contact: { ...good.contact, street: '  ' } }, 'contact/street'],
    ['half pennies', { ...good, totalMinor: 1.5 }, 'totalMinor'],
    ['no e-mail address', { ...good, contact: { ...good.contact, email: 'wren at home' } }, 'contact/email'],
  ])('refuses %s', (_, body, pointer) => {
    const parsed = checkoutBody.safeParse(body);
    expect(parsed.success ? [] : parsed.error.issues.map(({ path }) => path.join('/'))).toEqual([pointer]);
  });
});
