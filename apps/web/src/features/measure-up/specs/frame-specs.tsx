import type { AnswerValue } from '@linkfell/contracts';
import { MountDrawing } from '../../../components/drawing/mount-drawing';
import { lengthOf, lengthOrNull, mm, rawLength, toolField, typedOf } from './read';
import { question, type FieldSpec, type QuestionSpec, type Raw } from './spec';

type End = AnswerValue<'frame-end'>;

const kinds = [
  { value: 'hardware', label: 'Mounting hardware', hint: 'Bush, spacers and a bolt through an eyelet' },
  { value: 'pin', label: 'A pin straight through the eye', hint: 'Nothing between the pin and the eye' },
  { value: 'bearing-bolt', label: 'A bolt for a bearing eye', hint: 'The shock’s own eye holds the bearing' },
  { value: 'trunnion', label: 'Trunnion', hint: 'Two bolts, one from each side, into the shock’s body' },
] as const;

const figures: Record<string, readonly FieldSpec[]> = {
  hardware: [
    {
      type: 'number',
      name: 'width',
      label: 'Width between the frame’s cheeks',
      hint: 'Usually 19 to 70 mm. Leave empty if you do not know.',
      units: ['mm', 'in'],
      optional: true,
    },
    {
      type: 'number',
      name: 'bolt',
      label: 'Bolt',
      hint: 'Usually 6, 8 or 10 mm',
      units: ['mm'],
      optional: true,
    },
    toolField,
  ],
  pin: [
    { type: 'number', name: 'diameter', label: 'Diameter of the pin', units: ['mm', 'in'], optional: true },
    {
      type: 'number',
      name: 'width',
      label: 'Width between the frame’s cheeks',
      units: ['mm', 'in'],
      optional: true,
    },
    toolField,
  ],
  'bearing-bolt': [
    { type: 'number', name: 'bolt', label: 'Bolt', units: ['mm'], optional: true },
    { type: 'number', name: 'width', label: 'Width across the bearing', units: ['mm', 'in'], optional: true },
    toolField,
  ],
};

function endValue(raw: Raw): unknown {
  const { kind, tool } = raw;
  switch (kind) {
    case 'hardware':
      return { kind, widthMm: lengthOrNull(raw, 'width'), boltMm: lengthOrNull(raw, 'bolt'), tool };
    case 'pin':
      return { kind, diameterMm: lengthOrNull(raw, 'diameter'), widthMm: lengthOrNull(raw, 'width'), tool };
    case 'bearing-bolt':
      return { kind, boltMm: lengthOrNull(raw, 'bolt'), widthMm: lengthOrNull(raw, 'width'), tool };
    default:
      return { kind };
  }
}

function endRaw(end: End): Raw {
  if (end.kind === 'trunnion') return { kind: end.kind };
  return {
    kind: end.kind,
    tool: end.tool,
    ...rawLength('width', end.widthMm),
    ...('boltMm' in end ? rawLength('bolt', end.boltMm) : {}),
    ...('diameterMm' in end ? rawLength('diameter', end.diameterMm) : {}),
  };
}

function endSummary(end: End): string {
  switch (end.kind) {
    case 'hardware':
      return `hardware, ${mm(end.widthMm)} wide, bolt ${mm(end.boltMm)}`;
    case 'pin':
      return `pin ${mm(end.diameterMm)}, ${mm(end.widthMm)} wide`;
    case 'bearing-bolt':
      return `bolt ${mm(end.boltMm)} for a bearing eye, ${mm(end.widthMm)} wide`;
    case 'trunnion':
      return 'trunnion';
  }
}

const endSpec = (title: string, yokeAt: 'frame-end' | 'link-end'): QuestionSpec =>
  question<End>({
    title,
    lead: 'Look at what the frame offers this end of the shock.',
    fields: (raw) => [
      { type: 'choice', name: 'kind', label: 'What holds this end?', choices: kinds },
      ...(figures[raw.kind ?? ''] ?? []),
    ],
    toValue: endValue,
    fromValue: endRaw,
    start: { tool: 'caliper' },
    summary: endSummary,
    unknown: 'Without it the mounts are not known, and every shock needs an answer first.',
    where: (
      <p>
        The frame’s manual lists it, often as width x bolt, such as 30x8. Otherwise measure between the
        frame’s two cheeks, and across the bare part of the bolt. A caliper tells 8 mm from 10 mm; a tape does
        not.
      </p>
    ),
    drawing: (raw, view) => {
      const answered = view.answers['frame-yoke'];
      const yoke =
        answered?.state === 'known' && (answered.value as AnswerValue<'frame-yoke'>).yoke === yokeAt;
      const widthMm = lengthOf(raw, 'width') ?? 30;
      const boltMm = lengthOf(raw, 'bolt') ?? 8;
      switch (raw.kind) {
        case 'pin':
          return (
            <MountDrawing
              figure={{ kind: 'pin', diameterMm: lengthOf(raw, 'diameter') ?? 15, widthMm, yoke }}
            />
          );
        case 'bearing-bolt':
          return <MountDrawing figure={{ kind: 'bearing-bolt', boltMm, widthMm, yoke }} />;
        case 'trunnion':
          return <MountDrawing figure={{ kind: 'trunnion', yoke }} />;
        default:
          return <MountDrawing figure={{ kind: 'hardware', widthMm, boltMm, yoke }} />;
      }
    },
  });

export const frameSpecs = {
  'frame-travel': question<AnswerValue<'frame-travel'>>({
    title: 'How much travel has the rear wheel?',
    lead: 'The frame’s maker prints it. It is not the stroke of the shock.',
    fields: () => [
      { type: 'number', name: 'travel', label: 'Travel of the rear wheel', units: ['mm', 'in'] },
    ],
    toValue: (raw) => ({ mm: lengthOf(raw, 'travel'), typed: typedOf(raw, 'travel', 'mm') }),
    fromValue: (value) => rawLength('travel', value.mm, value.typed),
    summary: (value) => mm(value.mm),
    unknown: 'Without it no pressure and no spring can be worked out for you.',
  }),
  'frame-yoke': question<AnswerValue<'frame-yoke'>>({
    title: 'Is the shock held by a yoke?',
    lead: 'A yoke is a fork-shaped piece between shock and linkage. It puts side load on the shock’s shaft.',
    fields: () => [
      {
        type: 'choice',
        name: 'yoke',
        label: 'Between shock and frame',
        choices: [
          { value: 'none', label: 'No yoke', hint: 'Both ends sit in the frame or its links directly' },
          { value: 'link-end', label: 'A yoke at the link end' },
          { value: 'frame-end', label: 'A yoke at the frame end' },
        ],
      },
    ],
    toValue: (raw) => ({ yoke: raw.yoke }),
    fromValue: (value) => ({ yoke: value.yoke }),
    summary: ({ yoke }) =>
      yoke === 'none' ? 'none' : yoke === 'link-end' ? 'at the link end' : 'at the frame end',
    unknown: 'Without it a coil shock needs an answer first; air shocks are judged all the same.',
  }),
  'frame-end': endSpec('What is at the frame end?', 'frame-end'),
  'link-end': endSpec('What is at the link end?', 'link-end'),
  'tunnel-width': question<AnswerValue<'tunnel-width'>>({
    title: 'How wide is the space for the shock?',
    lead: 'Across, between the tubes or links that the body sits between, at the narrowest place.',
    fields: () => [
      { type: 'number', name: 'tunnel', label: 'Narrowest width', units: ['mm', 'in'] },
      toolField,
    ],
    toValue: (raw) => ({ mm: lengthOf(raw, 'tunnel'), tool: raw.tool, typed: typedOf(raw, 'tunnel', 'mm') }),
    fromValue: (value) => ({ ...rawLength('tunnel', value.mm, value.typed), tool: value.tool }),
    start: { tool: 'caliper' },
    summary: (value) => mm(value.mm),
    unknown: 'Without it only shocks no wider than your present one are judged.',
  }),
  'reservoir-room': question<AnswerValue<'reservoir-room'>>({
    title: 'Is there room for a reservoir?',
    lead: 'A reservoir is a second chamber beside the body, about 40 mm across and 90 mm long.',
    fields: (raw) => [
      {
        type: 'choice',
        name: 'kind',
        label: 'Beside the shock, through its whole movement',
        choices: [
          { value: 'measured', label: 'There is room; I measured it' },
          { value: 'none', label: 'There is none' },
        ],
      },
      ...(raw.kind === 'measured'
        ? ([
            { type: 'number', name: 'across', label: 'Free room across', units: ['mm', 'in'] },
            { type: 'number', name: 'along', label: 'Free room along the shock', units: ['mm', 'in'] },
            toolField,
          ] as const)
        : []),
    ],
    toValue: (raw) =>
      raw.kind === 'none'
        ? { kind: 'none' }
        : {
            kind: raw.kind,
            diameterMm: lengthOf(raw, 'across'),
            lengthMm: lengthOf(raw, 'along'),
            tool: raw.tool,
          },
    fromValue: (value) =>
      value.kind === 'none'
        ? { kind: 'none' }
        : {
            kind: value.kind,
            tool: value.tool,
            ...rawLength('across', value.diameterMm),
            ...rawLength('along', value.lengthMm),
          },
    start: { tool: 'ruler' },
    summary: (value) =>
      value.kind === 'none' ? 'none' : `${mm(value.diameterMm)} across, ${mm(value.lengthMm)} along`,
    unknown:
      'Without it shocks with a reservoir need an answer first; inline shocks are judged all the same.',
  }),
  'cable-routing': question<AnswerValue<'cable-routing'>>({
    title: 'Is there a way for a remote’s cable?',
    fields: () => [
      {
        type: 'choice',
        name: 'routing',
        label: 'Cable to the shock',
        choices: [
          { value: 'internal', label: 'Through the frame' },
          { value: 'external', label: 'Along the outside, with guides' },
          { value: 'none', label: 'No way for it' },
        ],
      },
    ],
    toValue: (raw) => ({ routing: raw.routing }),
    fromValue: (value) => ({ routing: value.routing }),
    summary: ({ routing }) => routing,
    unknown: 'It only matters if you want to work the shock from the bar.',
  }),
  'e-bike': question<AnswerValue<'e-bike'>>({
    title: 'Is it an e-bike?',
    lead: 'An e-bike needs a shock that its maker allows there.',
    fields: () => [
      {
        type: 'choice',
        name: 'eBike',
        label: 'Motor',
        layout: 'row',
        choices: [
          { value: 'yes', label: 'Yes, it has a motor' },
          { value: 'no', label: 'No motor' },
        ],
      },
    ],
    toValue: (raw) => ({ eBike: raw.eBike === 'yes' ? true : raw.eBike === 'no' ? false : undefined }),
    fromValue: (value) => ({ eBike: value.eBike ? 'yes' : 'no' }),
    summary: ({ eBike }) => (eBike ? 'yes' : 'no'),
    unknown: null,
  }),
} as const;
