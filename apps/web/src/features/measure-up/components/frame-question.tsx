import type { AnswerValue, FrameSummary, MeasureUpView, StoredAnswer } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { useDeferredValue, useMemo, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { Button } from '../../../components/button';
import { ChoiceGroup } from '../../../components/forms/choice-group';
import { ErrorSummary } from '../../../components/forms/error-summary';
import { Field } from '../../../components/forms/field';
import { Select } from '../../../components/forms/select';
import { TextInput } from '../../../components/forms/text-input';
import { PageHeading } from '../../../components/page-heading';
import { isApiProblem } from '../../../lib/api-problem';
import { usePageTitle } from '../../../lib/page-title';
import { frameQuery, framesQuery, useAnswer } from '../api/measure-up';
import type { FieldSpec, Raw } from '../specs/spec';
import { useQuestionForm } from '../use-question-form';
import { MeasureUpFrame, stepOf } from './measure-up-frame';
import { addressAfter } from './question-form';
import { SheetFigures } from './sheet-figures';

type Frame = AnswerValue<'frame'>;
const title = 'Which frame is it?';
/** More than a telephone shows at once is asked for, so that the way on stays near. */
const atFirst = 8;

const counted = (count: number): string =>
  count === 0
    ? 'No frame in our list is called that. Choose “Not listed: describe it” above.'
    : count === 1
      ? '1 frame'
      : `${count} frames`;

const fields: readonly FieldSpec[] = [
  { type: 'text', name: 'kind', label: 'Frame' },
  { type: 'text', name: 'frameId', label: 'Frame' },
  { type: 'text', name: 'name', label: 'Name' },
  { type: 'text', name: 'modelYear', label: 'Model year' },
];

function toValue(raw: Raw): unknown {
  if (raw.kind === 'described') return { kind: 'described', name: raw.name ?? '' };
  return {
    kind: 'listed',
    frameId: raw.frameId ?? '',
    modelYear: raw.modelYear ? Number(raw.modelYear) : null,
    frameSize: raw.frameSize || null,
    chip: raw.chip || null,
  };
}

const fromValue = (frame: Frame): Raw =>
  frame.kind === 'described'
    ? { kind: 'described', name: frame.name }
    : {
        kind: 'listed',
        frameId: frame.frameId,
        modelYear: frame.modelYear ? String(frame.modelYear) : '',
        frameSize: frame.frameSize ?? '',
        chip: frame.chip ?? '',
      };

const nameOf = (frame: FrameSummary): string =>
  `${frame.makerName} ${frame.model}, ${frame.yearFrom}–${frame.yearTo}`;

/** The first question: a frame that we have a sheet for, or one that the rider describes. */
export function FrameQuestion({ view }: { view: MeasureUpView }) {
  const stored = view.answers.frame as StoredAnswer<'frame'> | undefined;
  const start = useMemo<Raw>(
    () => (stored?.state === 'known' ? fromValue(stored.value) : { kind: 'listed' }),
    [stored],
  );
  const form = useQuestionForm('frame', start, () => fields, toValue);
  const answer = useAnswer(view.id);
  const navigate = useNavigate();
  const { raw, change, fault } = form;
  usePageTitle(title, { error: form.faults.length > 0 });
  const found = useQuery(framesQuery(useDeferredValue(raw.q ?? '')));
  const [all, setAll] = useState(false);
  const listed = found.data?.frames ?? [];
  // The answer that is changed stands on top; a choice made now stays where it was made.
  const frames = [
    ...listed.filter(({ id }) => id === start.frameId),
    ...listed.filter(({ id }) => id !== start.frameId),
  ];
  const shown = all ? frames : frames.filter(({ id }, index) => index < atFirst || id === raw.frameId);

  const send = (value: unknown) =>
    answer.mutate(
      { question: 'frame', answer: { state: 'known', value } },
      {
        onSuccess: (next) => void navigate(addressAfter(next, 'frame')),
        onError: (problem) =>
          form.setFault(
            'frameId',
            isApiProblem(problem) ? (problem.errors[0]?.detail ?? problem.title) : 'Not saved; try again.',
          ),
      },
    );
  return (
    <MeasureUpFrame view={view} step="frame">
      <ErrorSummary faults={form.faults} attempt={form.attempt} />
      <PageHeading
        above={stepOf('frame')}
        lead="The frame decides which shock fits; the wheel’s travel alone says nothing."
      >
        {title}
      </PageHeading>
      <chakra.form maxWidth="form" noValidate onSubmit={(event) => void form.submit(send)(event)}>
        <ChoiceGroup
          id="kind"
          name="kind"
          legend="Your frame"
          layout="row"
          choices={[
            { value: 'listed', label: 'Find it in our list' },
            { value: 'described', label: 'Not listed: describe it' },
          ]}
          value={raw.kind ?? null}
          onChange={(kind) => change({ kind })}
        />
        {raw.kind === 'described' ? (
          <Field
            id="name"
            label="What do you call it?"
            hint="Maker and model, if you know them. You describe it by its measurements next."
            error={fault('name')}
          >
            {(control) => (
              <TextInput
                {...control}
                value={raw.name ?? ''}
                onChange={(event) => change({ name: event.target.value })}
              />
            )}
          </Field>
        ) : (
          <>
            <Field id="q" label="Maker, model or year" hint="Such as Withen 2023">
              {(control) => (
                <TextInput
                  {...control}
                  type="search"
                  autoComplete="off"
                  value={raw.q ?? ''}
                  onChange={(event) => change({ q: event.target.value })}
                />
              )}
            </Field>
            <chakra.p role="status" color="slate" fontSize="sm" marginBottom="2">
              {found.isSuccess ? counted(frames.length) : 'Looking'}
            </chakra.p>
            <ChoiceGroup
              id="frameId"
              name="frameId"
              legend="Frames"
              error={fault('frameId')}
              choices={shown.map((frame) => ({
                value: frame.id,
                label: nameOf(frame),
                hint: `${[...new Set(frame.travelMm)].join(' or ')} mm travel · takes ${[...new Set(frame.sizes)].join(' or ')}`,
              }))}
              value={raw.frameId ?? null}
              onChange={(frameId) => change({ frameId, frameSize: '', chip: '', modelYear: '' })}
            />
            {shown.length < frames.length ? (
              <chakra.div marginBottom="6">
                <Button tone="plain" onClick={() => setAll(true)}>
                  Show all {frames.length} frames
                </Button>
              </chakra.div>
            ) : null}
            {raw.frameId ? (
              <Variant frameId={raw.frameId} raw={raw} change={change} error={fault('modelYear')} />
            ) : null}
          </>
        )}
        <Button type="submit" size="large" busy={answer.isPending && 'Saving'}>
          Continue
        </Button>
      </chakra.form>
    </MeasureUpFrame>
  );
}

/** Year, size and chip, where the sheet tells them apart. */
function Variant({
  frameId,
  raw,
  change,
  error,
}: {
  frameId: string;
  raw: Raw;
  change: (change: Raw) => void;
  error?: string;
}) {
  const { data: sheet } = useQuery(frameQuery(frameId));
  if (!sheet) return null;
  const { yearFrom, yearTo } = sheet.frame;
  const years = Array.from({ length: yearTo - yearFrom + 1 }, (_, i) => String(yearFrom + i));
  const sizes = [...new Set(sheet.entries.flatMap((entry) => entry.frameSizes ?? []))];
  const chips = [...new Set(sheet.entries.flatMap((entry) => entry.chip ?? []))];
  const pick = (name: string, label: string, options: readonly string[], hint?: string) =>
    options.length === 0 ? null : (
      <Field id={name} label={label} hint={hint} error={name === 'modelYear' ? error : undefined}>
        {(control) => (
          <Select
            {...control}
            value={raw[name] ?? ''}
            onChange={(event) => change({ [name]: event.target.value })}
          >
            <option value="">I don’t know</option>
            {options.map((option) => (
              <option key={option}>{option}</option>
            ))}
          </Select>
        )}
      </Field>
    );
  return (
    <>
      {pick('modelYear', 'Model year', years)}
      {pick('frameSize', 'Frame size', sizes, 'This frame takes another stroke in other sizes')}
      {pick('chip', 'Chip position', chips, 'Where the flip chip is set now')}
      <SheetFigures sheet={sheet} />
    </>
  );
}
