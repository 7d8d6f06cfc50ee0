import type { AnswerValue } from '@linkfell/contracts';
import { formatMoney } from '../../../lib/format-money';
import { parseNumber } from '../../../components/forms/parse-number';
import { massOf, typedOf } from './read';
import { question } from './spec';

const kg = (value: number): string => `${Number(value.toFixed(1))} kg`;

export const riderSpecs = {
  'spring-wish': question<AnswerValue<'spring-wish'>>({
    title: 'Air, coil, or either?',
    lead: 'Air is light, set with a pump, and firms up towards the end. Coil is sensitive and even, heavier, and its spring is chosen by rate and costs extra.',
    fields: () => [
      {
        type: 'choice',
        name: 'wish',
        label: 'Show me',
        choices: [
          { value: 'either', label: 'Either' },
          { value: 'air', label: 'Air only' },
          { value: 'coil', label: 'Coil only' },
        ],
      },
    ],
    toValue: (raw) => ({ wish: raw.wish }),
    fromValue: (value) => ({ wish: value.wish }),
    start: { wish: 'either' },
    summary: ({ wish }) => wish,
    unknown: null,
  }),
  weight: question<AnswerValue<'weight'>>({
    title: 'What do you weigh?',
    lead: 'You alone, and what you carry on a ride: helmet, shoes, pack, water.',
    fields: () => [
      {
        type: 'number',
        name: 'rider',
        label: 'You',
        hint: 'Such as 80, or 12 st 8',
        units: ['kg', 'lb', 'st'],
      },
      { type: 'number', name: 'kit', label: 'Kit', hint: 'Usually 2 to 6 kg', units: ['kg', 'lb'] },
    ],
    toValue: (raw) => ({
      riderKg: massOf(raw, 'rider'),
      kitKg: massOf(raw, 'kit'),
      typed: typedOf(raw, 'rider', 'kg'),
    }),
    fromValue: (value) => ({
      rider: value.typed?.text ?? String(value.riderKg),
      'rider-unit': value.typed?.unit ?? 'kg',
      kit: String(Number(value.kitKg.toFixed(1))),
      'kit-unit': 'kg',
    }),
    start: { kit: '3' },
    summary: (value) => `${kg(value.riderKg)}, kit ${kg(value.kitKg)}`,
    unknown:
      'Without it neither pressure nor spring can be worked out, and every shock needs an answer first.',
  }),
  'bike-mass': question<AnswerValue<'bike-mass'>>({
    title: 'What does the bike weigh?',
    fields: () => [
      {
        type: 'number',
        name: 'bike',
        label: 'Whole bike',
        hint: 'Trail bikes 13 to 16 kg, e-bikes 20 to 26 kg',
        units: ['kg', 'lb'],
      },
    ],
    toValue: (raw) => ({ kg: massOf(raw, 'bike'), typed: typedOf(raw, 'bike', 'kg') }),
    fromValue: (value) => ({
      bike: value.typed?.text ?? String(value.kg),
      'bike-unit': value.typed?.unit ?? 'kg',
    }),
    summary: (value) => kg(value.kg),
    unknown: 'Without it neither pressure nor spring can be worked out.',
  }),
  style: question<AnswerValue<'style'>>({
    title: 'How do you ride?',
    lead: 'It sets how far the shock should settle under you.',
    fields: () => [
      {
        type: 'choice',
        name: 'style',
        label: 'Mostly',
        choices: [
          { value: 'cross-country', label: 'Cross-country', hint: '20 to 25 % sag' },
          { value: 'trail', label: 'Trail', hint: '25 to 30 % sag' },
          { value: 'enduro', label: 'Enduro', hint: '28 to 33 % sag' },
          { value: 'downhill', label: 'Downhill', hint: '30 to 35 % sag' },
        ],
      },
    ],
    toValue: (raw) => ({ style: raw.style }),
    fromValue: (value) => ({ style: value.style }),
    summary: ({ style }) => style,
    unknown: null,
  }),
  'remote-wish': question<AnswerValue<'remote-wish'>>({
    title: 'Do you want to work it from the bar?',
    fields: (raw) => [
      {
        type: 'choice',
        name: 'wants',
        label: 'Remote lockout',
        choices: [
          { value: 'no', label: 'No' },
          { value: 'yes', label: 'Yes', hint: 'Shocks without a remote then do not do what you asked' },
        ],
      },
      ...(raw.wants === 'yes'
        ? ([
            {
              type: 'check',
              name: 'external',
              label: 'The cable may run outside the frame if there is no way through it',
            },
          ] as const)
        : []),
    ],
    toValue: (raw) => ({
      wants: raw.wants === 'yes' ? true : raw.wants === 'no' ? false : undefined,
      acceptsExternal: raw.wants === 'yes' ? raw.external === 'yes' : null,
    }),
    fromValue: (value) => ({
      wants: value.wants ? 'yes' : 'no',
      external: value.acceptsExternal ? 'yes' : '',
    }),
    summary: ({ wants }) => (wants ? 'yes' : 'no'),
    unknown: null,
  }),
  'reservoir-wish': question<AnswerValue<'reservoir-wish'>>({
    title: 'With or without a reservoir?',
    lead: 'More oil keeps the damping the same when it gets hot. It needs room in the frame.',
    fields: () => [
      {
        type: 'choice',
        name: 'wish',
        label: 'Show me',
        choices: [
          { value: 'either', label: 'Both' },
          { value: 'with', label: 'With a reservoir' },
          { value: 'without', label: 'Inline only' },
        ],
      },
    ],
    toValue: (raw) => ({ wish: raw.wish }),
    fromValue: (value) => ({ wish: value.wish }),
    start: { wish: 'either' },
    summary: ({ wish }) => wish,
    unknown: null,
  }),
  budget: question<AnswerValue<'budget'>>({
    title: 'What may it cost, fitted?',
    fields: () => [{ type: 'number', name: 'pounds', label: 'At most', units: ['£'] }],
    toValue: (raw) => {
      const pounds = parseNumber((raw.pounds ?? '').replace('£', ''));
      return { maxMinor: pounds === null ? undefined : Math.round(pounds * 100) };
    },
    fromValue: (value) => ({ pounds: String(value.maxMinor / 100) }),
    summary: ({ maxMinor }) => `up to ${formatMoney(maxMinor)}`,
    unknown: 'Then every price is shown.',
  }),
  place: question<AnswerValue<'place'>>({
    title: 'Where are you?',
    lead: 'For the distance to a workshop, and the air pressure where you fill the shock.',
    fields: () => [{ type: 'town', name: 'town', label: 'Nearest town' }],
    toValue: (raw) => ({ townId: raw.town ?? '', heightM: null }),
    fromValue: (value) => ({ town: value.townId }),
    summary: ({ townId }) => townId.replaceAll('-', ' '),
    unknown: 'Then no distances are shown.',
  }),
} as const;
