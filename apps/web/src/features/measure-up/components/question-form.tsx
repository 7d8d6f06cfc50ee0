import type { MeasureUpView, QuestionKey, StoredAnswer } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { useMemo } from 'react';
import { useNavigate } from 'react-router-dom';
import { Button } from '../../../components/button';
import { Disclosure } from '../../../components/disclosure';
import { ErrorSummary } from '../../../components/forms/error-summary';
import { Notice } from '../../../components/notice';
import { PageHeading } from '../../../components/page-heading';
import { isApiProblem } from '../../../lib/api-problem';
import { usePageTitle } from '../../../lib/page-title';
import { useAnswer } from '../api/measure-up';
import { specs } from '../specs/registry';
import type { Raw } from '../specs/spec';
import { useQuestionForm } from '../use-question-form';
import { FieldView } from './field-view';
import { HelpLinks } from './help-links';
import { Beside, MeasureUpFrame, Sheet, stepOf } from './measure-up-frame';
import { SizeSays } from './size-says';

type Key = Exclude<QuestionKey, 'frame'>;

/** The address after a question: the next one in order, or the list of all answers. */
export function addressAfter(view: MeasureUpView, key: QuestionKey): string {
  const index = view.questions.findIndex((question) => question.key === key);
  return `/measure-up/${view.id}/${view.questions[index + 1]?.key ?? 'check'}`;
}

export function QuestionForm({ view, questionKey }: { view: MeasureUpView; questionKey: Key }) {
  const spec = specs[questionKey];
  const stored = view.answers[questionKey] as StoredAnswer | undefined;
  const start = useMemo<Raw>(
    () => ({ ...spec.start, ...(stored?.state === 'known' ? spec.fromValue(stored.value as never) : {}) }),
    [spec, stored],
  );
  const form = useQuestionForm(questionKey, start, (raw) => spec.fields(raw, view), spec.toValue);
  const answer = useAnswer(view.id);
  const navigate = useNavigate();
  usePageTitle(spec.title, { error: form.faults.length > 0 });
  const step = view.questions.find(({ key }) => key === questionKey)?.step ?? 'check';
  const index = view.questions.findIndex(({ key }) => key === questionKey);
  const before = view.questions[index - 1]?.key;

  const send = (given: Parameters<typeof answer.mutate>[0]['answer']) =>
    answer.mutate(
      { question: questionKey, answer: given },
      {
        onSuccess: (next) => void navigate(addressAfter(next, questionKey)),
        onError: (problem) => {
          const first = spec.fields(form.raw, view)[0]?.name ?? 'question';
          const said = isApiProblem(problem)
            ? (problem.errors[0]?.detail ?? problem.detail ?? problem.title)
            : null;
          form.setFault(first, said ?? 'This could not be saved. What you typed is still here; try again.');
        },
      },
    );

  const drawing = spec.drawing?.(form.raw, view);
  return (
    <MeasureUpFrame view={view} step={step}>
      <ErrorSummary faults={form.faults} attempt={form.attempt} />
      <PageHeading above={stepOf(step)} lead={spec.lead}>
        {spec.title}
      </PageHeading>
      <Beside>
        <form
          noValidate
          onSubmit={(event) => void form.submit((value) => send({ state: 'known', value }))(event)}
        >
          <HelpLinks questionKey={questionKey} />
          {spec.where ? <Disclosure summary="Where do I find this?">{spec.where}</Disclosure> : null}
          {spec.cautions ? <Cautions lines={spec.cautions} /> : null}
          {spec.fields(form.raw, view).map((field) => (
            <FieldView
              key={field.name}
              field={field}
              raw={form.raw}
              error={form.fault(field.name)}
              onChange={form.change}
            />
          ))}
          <SizeSays view={view} questionKey={questionKey} raw={form.raw} />
          <chakra.div display="flex" flexWrap="wrap" columnGap="3" rowGap="1" marginTop="6">
            <Button type="submit" size="large" busy={answer.isPending && 'Saving'}>
              Continue
            </Button>
            {spec.unknown ? (
              <Button tone="plain" size="large" onClick={() => send({ state: 'unknown' })}>
                I don’t know
              </Button>
            ) : null}
            {before ? (
              <Button
                tone="quiet"
                marginLeft="-2"
                onClick={() => void navigate(`/measure-up/${view.id}/${before}`)}
              >
                Back
              </Button>
            ) : null}
          </chakra.div>
          {spec.unknown ? (
            <chakra.p color="slate" fontSize="sm" marginTop="3">
              If you don’t know: {spec.unknown.charAt(0).toLowerCase() + spec.unknown.slice(1)}
            </chakra.p>
          ) : null}
        </form>
        {drawing ? <Sheet>{drawing}</Sheet> : null}
      </Beside>
    </MeasureUpFrame>
  );
}

function Cautions({ lines }: { lines: readonly string[] }) {
  return (
    <chakra.div marginBottom="6">
      <Notice tone="gorse" title="Before you start">
        <chakra.ul paddingLeft="5" listStyleType="disc">
          {lines.map((line) => (
            <li key={line}>{line}</li>
          ))}
        </chakra.ul>
      </Notice>
    </chakra.div>
  );
}
