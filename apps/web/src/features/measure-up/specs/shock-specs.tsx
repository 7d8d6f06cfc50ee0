import type { AnswerValue } from '@linkfell/contracts';
import { findSizeKey } from '@linkfell/fit-engine';
import { HardwareSoFar, YourShock } from './drawings';
import { awkwardField, lengthOf, mm, rawLength, toolField, typedOf } from './read';
import { question, type FieldSpec, type Raw } from './spec';

const mountChoices = [
  { value: 'eyelet', label: 'Eyelet', hint: 'A round eye that takes a bush' },
  { value: 'bearing-eye', label: 'Bearing eye', hint: 'An eye with its own bearing' },
  { value: 'trunnion', label: 'Trunnion', hint: 'Threaded holes either side of the body' },
] as const;

const air = [
  'Support the bike before you let air out. Let it out slowly at the valve, then cycle the shock gently.',
  'A shock that stays down after letting the air out holds pressure inside: do not open it, take it to a workshop.',
  'Never unscrew a can under pressure and never touch the damper’s gas valve. Wear eye protection.',
  'On a coil shock, back the collar right off before you lift the spring.',
];

const hardwareEnd = (end: 'frame' | 'link', name: string): readonly FieldSpec[] => [
  {
    type: 'number',
    name: `${end}-width`,
    label: `Width at the ${name} end`,
    hint: 'Across the spacers, outside to outside. Leave empty if there is none.',
    units: ['mm', 'in'],
    optional: true,
  },
  { type: 'number', name: `${end}-bolt`, label: `Bolt at the ${name} end`, units: ['mm'], optional: true },
  {
    type: 'number',
    name: `${end}-bore`,
    label: `Hole of the eye at the ${name} end`,
    hint: 'Across, with the hardware out. Without it we count new hardware.',
    units: ['mm'],
    optional: true,
  },
  {
    type: 'choice',
    name: `${end}-sound`,
    label: 'Its state',
    layout: 'row',
    choices: [
      { value: 'yes', label: 'No play, no damage' },
      { value: 'no', label: 'Worn' },
      { value: 'unseen', label: 'Not looked at' },
    ],
  },
];

function endOf(raw: Raw, end: 'frame' | 'link'): unknown {
  const typed = (field: string): boolean => (raw[`${end}-${field}`] ?? '').trim() !== '';
  if (!typed('width') && !typed('bolt') && !typed('bore')) return null;
  const sound = raw[`${end}-sound`];
  return {
    // Never guessed: old hardware moves across only into an eye of the same hole.
    boreMm: typed('bore') ? lengthOf(raw, `${end}-bore`) : null,
    widthMm: lengthOf(raw, `${end}-width`),
    boltMm: lengthOf(raw, `${end}-bolt`),
    sound: sound === 'yes' ? true : sound === 'no' ? false : null,
  };
}

const endRaw = (end: 'frame' | 'link', value: AnswerValue<'hardware'>['frameEnd']): Raw =>
  value
    ? {
        ...rawLength(`${end}-width`, value.widthMm),
        ...rawLength(`${end}-bolt`, value.boltMm),
        ...(value.boreMm === null ? {} : rawLength(`${end}-bore`, value.boreMm)),
        [`${end}-sound`]: value.sound === null ? 'unseen' : value.sound ? 'yes' : 'no',
      }
    : {};

export const shockSpecs = {
  'printed-size': question<AnswerValue<'printed-size'>>({
    title: 'Is its size printed on it, or on an invoice?',
    lead: 'Published figures come before anything you can measure.',
    fields: () => [
      {
        type: 'text',
        name: 'text',
        label: 'Size as printed',
        hint: 'Such as 210x55, or 7.875 x 2.25 in inches. The order of the two does not matter.',
      },
    ],
    toValue: (raw) => ({ text: raw.text ?? '', sizeKey: findSizeKey(raw.text ?? '') ?? undefined }),
    fromValue: (value) => ({ text: value.text }),
    summary: (value) =>
      value.text === value.sizeKey ? value.text : `${value.text}, that is ${value.sizeKey}`,
    unknown: 'Then we work the size out from what you measure.',
    drawing: (raw, view) => {
      const key = findSizeKey(raw.text ?? '')
        ?.split('x')
        .map(Number);
      return <YourShock view={view} change={key ? { eyeToEyeMm: key[0], strokeMm: key[1] } : {}} />;
    },
  }),
  'eye-to-eye': question<AnswerValue<'eye-to-eye'>>({
    title: 'How far apart are the two eyes?',
    lead: 'Centre of one hole to centre of the other, the shock fully extended and at riding pressure. On a trunnion shock: from the axis of the trunnion bolts.',
    fields: () => [
      { type: 'number', name: 'length', label: 'Eye-to-eye', units: ['mm', 'in'] },
      toolField,
      awkwardField,
    ],
    toValue: (raw) => ({
      mm: lengthOf(raw, 'length'),
      tool: raw.tool,
      awkward: raw.awkward === 'yes',
      typed: typedOf(raw, 'length', 'mm'),
    }),
    fromValue: (value) => ({
      ...rawLength('length', value.mm, value.typed),
      tool: value.tool,
      awkward: value.awkward ? 'yes' : '',
    }),
    start: { tool: 'caliper' },
    summary: (value) => `${mm(value.mm)}, ${value.tool}`,
    unknown: 'Without it your present shock says nothing about the size.',
    where: (
      <p>
        Many calipers stop at 150 mm: use a 300 mm one, or measure from the same edge of one eye to the same
        edge of the other. An emptied air shock is pulled short by its negative spring, so leave the air in.
      </p>
    ),
    drawing: (raw, view) => (
      <YourShock
        view={view}
        asked="eye-to-eye"
        text={raw.length}
        change={{ eyeToEyeMm: lengthOf(raw, 'length') }}
      />
    ),
  }),
  stroke: question<AnswerValue<'stroke'>>({
    title: 'How far does it shorten?',
    lead: 'The stroke. It is not the travel of the wheel.',
    fields: () => [
      {
        type: 'choice',
        name: 'method',
        label: 'How you measure it',
        choices: [
          { value: 'compressed', label: 'Eye-to-eye, all air out, pushed together', hint: 'The surest way' },
          {
            value: 'shaft',
            label: 'Travel of the shaft, by its O-ring',
            hint: 'After a ride the ring shows only the stroke you used',
          },
        ],
      },
      { type: 'number', name: 'stroke', label: 'Reading', units: ['mm', 'in'] },
      toolField,
      awkwardField,
    ],
    toValue: (raw) => ({
      method: raw.method,
      reading: {
        mm: lengthOf(raw, 'stroke'),
        tool: raw.tool,
        awkward: raw.awkward === 'yes',
        typed: typedOf(raw, 'stroke', 'mm'),
      },
    }),
    fromValue: ({ method, reading }) => ({
      method,
      ...rawLength('stroke', reading.mm, reading.typed),
      tool: reading.tool,
      awkward: reading.awkward ? 'yes' : '',
    }),
    start: { method: 'compressed', tool: 'caliper' },
    summary: ({ method, reading }) =>
      `${mm(reading.mm)} ${method === 'shaft' ? 'of shaft' : 'pushed together'}, ${reading.tool}`,
    unknown: 'Without it several strokes stay possible.',
    cautions: air,
    drawing: (raw, view) => {
      const read = lengthOf(raw, 'stroke');
      const extended = view.drawing?.eyeToEyeMm ?? 210;
      const strokeMm = read === undefined ? undefined : raw.method === 'compressed' ? extended - read : read;
      return (
        <YourShock
          view={view}
          asked="stroke"
          ghost
          text={strokeMm ? String(Number(strokeMm.toFixed(1))) : '?'}
          change={{ strokeMm }}
        />
      );
    },
  }),
  'size-confirm': question<AnswerValue<'size-confirm'>>({
    title: 'Your reading and the sheet disagree',
    lead: 'Your present shock is settled on a size that the frame’s maker does not list.',
    fields: () => [
      {
        type: 'choice',
        name: 'confirms',
        label: 'Which is right?',
        choices: [
          { value: 'yes', label: 'The sheet is right; a wrong shock is fitted now' },
          { value: 'no', label: 'I am not sure', hint: 'Every shock then needs an answer first' },
        ],
      },
    ],
    toValue: (raw) => ({
      confirmsSheetSize: raw.confirms === 'yes' ? true : raw.confirms === 'no' ? false : undefined,
    }),
    fromValue: (value) => ({ confirms: value.confirmsSheetSize ? 'yes' : 'no' }),
    summary: (value) => (value.confirmsSheetSize ? 'the sheet is right' : 'not sure'),
    unknown: 'Then every shock needs an answer first.',
  }),
  mounts: question<AnswerValue<'mounts'>>({
    title: 'What do its two ends look like?',
    lead: 'Body end is the end with the can; shaft end is where the shaft comes out.',
    fields: () => [
      { type: 'choice', name: 'bodyEnd', label: 'Body end', choices: mountChoices },
      { type: 'choice', name: 'shaftEnd', label: 'Shaft end', choices: mountChoices.slice(0, 2) },
    ],
    toValue: (raw) => ({ bodyEnd: raw.bodyEnd, shaftEnd: raw.shaftEnd }),
    fromValue: (value) => ({ ...value }),
    summary: ({ bodyEnd, shaftEnd }) => `${bodyEnd.replace('-', ' ')} / ${shaftEnd.replace('-', ' ')}`,
    unknown: 'Then sizes of both families stay possible.',
    drawing: (raw, view) => (
      <YourShock
        view={view}
        change={{
          bodyEnd:
            raw.bodyEnd === 'trunnion'
              ? { kind: 'trunnion' }
              : raw.bodyEnd === 'bearing-eye'
                ? { kind: 'bearing-eye', boltMm: 8, widthMm: 30 }
                : { kind: 'eyelet', boreMm: 15 },
          shaftEnd:
            raw.shaftEnd === 'bearing-eye'
              ? { kind: 'bearing-eye', boltMm: 8, widthMm: 30 }
              : { kind: 'eyelet', boreMm: 15 },
        }}
      />
    ),
  }),
  hardware: question<AnswerValue<'hardware'>>({
    title: 'Which hardware is on it now?',
    lead: 'A new shock has none. Sound hardware of the right size can move across; a workshop presses it.',
    fields: () => [...hardwareEnd('frame', 'frame'), ...hardwareEnd('link', 'link')],
    toValue: (raw) => ({ frameEnd: endOf(raw, 'frame'), linkEnd: endOf(raw, 'link') }),
    fromValue: (value) => ({ ...endRaw('frame', value.frameEnd), ...endRaw('link', value.linkEnd) }),
    start: { 'frame-sound': 'unseen', 'link-sound': 'unseen' },
    summary: ({ frameEnd, linkEnd }) =>
      [frameEnd, linkEnd].map((end) => (end ? `${end.widthMm}x${end.boltMm} mm` : 'none')).join(' / '),
    unknown: 'Then new hardware is counted wherever the frame needs some.',
    drawing: (raw) => (
      <>
        <HardwareSoFar raw={raw} end="frame" />
        <HardwareSoFar raw={raw} end="link" />
      </>
    ),
  }),
  'can-diameter': question<AnswerValue<'can-diameter'>>({
    title: 'How thick is its body?',
    lead: 'Across the widest part of the air can, or outside the coil.',
    fields: () => [{ type: 'number', name: 'can', label: 'Diameter', units: ['mm', 'in'] }, toolField],
    toValue: (raw) => ({ mm: lengthOf(raw, 'can'), tool: raw.tool, typed: typedOf(raw, 'can', 'mm') }),
    fromValue: (value) => ({ ...rawLength('can', value.mm, value.typed), tool: value.tool }),
    start: { tool: 'caliper' },
    summary: (value) => mm(value.mm),
    unknown: 'It only matters where the width of the frame is not known.',
    drawing: (raw, view) => (
      <YourShock view={view} asked="diameter" text={raw.can} change={{ diameterMm: lengthOf(raw, 'can') }} />
    ),
  }),
  'present-spring': question<AnswerValue<'present-spring'>>({
    title: 'Is its spring air or a coil?',
    fields: () => [
      {
        type: 'choice',
        name: 'spring',
        label: 'Spring',
        choices: [
          { value: 'air', label: 'Air', hint: 'Set with a shock pump' },
          { value: 'coil', label: 'Coil', hint: 'A steel spring around the body' },
        ],
      },
    ],
    toValue: (raw) => ({ spring: raw.spring }),
    fromValue: (value) => ({ spring: value.spring }),
    summary: ({ spring }) => spring,
    unknown: 'It only matters where the width of the frame is not known.',
    drawing: (raw, view) => (
      <YourShock view={view} change={{ spring: raw.spring === 'coil' ? 'coil' : 'air' }} />
    ),
  }),
  'present-remote': question<AnswerValue<'present-remote'>>({
    title: 'Can it be worked from the bar?',
    fields: (raw) => [
      {
        type: 'choice',
        name: 'action',
        label: 'Remote',
        choices: [
          { value: 'none', label: 'No remote' },
          { value: 'pull-to-lock', label: 'Pull to lock', hint: 'Without a cable the shock stays open' },
          { value: 'pull-to-open', label: 'Pull to open', hint: 'Without a cable the shock stays locked' },
        ],
      },
      ...(raw.action && raw.action !== 'none'
        ? ([
            {
              type: 'choice',
              name: 'line',
              label: 'Line',
              layout: 'row',
              choices: [
                { value: 'cable', label: 'Cable' },
                { value: 'hydraulic', label: 'Hydraulic' },
              ],
            },
          ] as const)
        : []),
    ],
    toValue: (raw) => ({ action: raw.action, line: raw.action === 'none' ? null : (raw.line ?? null) }),
    fromValue: (value) => ({ action: value.action, line: value.line ?? '' }),
    summary: ({ action }) => action.replaceAll('-', ' '),
    unknown: 'Then a lever is counted wherever you want a remote.',
  }),
  'sold-with-bike': question<AnswerValue<'sold-with-bike'>>({
    title: 'Is it the shock the bike was sold with?',
    lead: 'Nobody has listed your frame, so its size can only come from the shock it was built with.',
    fields: () => [
      {
        type: 'choice',
        name: 'sold',
        label: 'Since the bike was new',
        choices: [
          { value: 'yes', label: 'Yes, it was never changed' },
          { value: 'no', label: 'No, it was changed' },
        ],
      },
    ],
    toValue: (raw) => ({ soldWithBike: raw.sold }),
    fromValue: (value) => ({ sold: value.soldWithBike }),
    summary: ({ soldWithBike }) => soldWithBike,
    unknown: 'Then eye-to-eye and stroke are not known, and every shock needs an answer first.',
  }),
} as const;
