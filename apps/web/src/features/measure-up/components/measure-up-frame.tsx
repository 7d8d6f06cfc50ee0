import { steps, type MeasureUpView, type Step } from '@linkfell/contracts';
import type { ReactNode } from 'react';
import { chakra } from '@chakra-ui/react';
import { Page } from '../../../components/page';
import { StepList, type StepState } from '../../../components/step-list';
import { stepNames } from '../specs/registry';

const timeOf = (instant: string): string =>
  new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit' }).format(new Date(instant));

/** Where the rider is in the measure-up, and that everything is kept. */
export function MeasureUpFrame({
  view,
  step,
  children,
}: {
  view: MeasureUpView;
  step: Step;
  children: ReactNode;
}) {
  const now = steps.indexOf(step);
  const stateOf = (each: Step, index: number): StepState => {
    if (index === now) return 'now';
    const questions = view.questions.filter((question) => question.step === each);
    return questions.length > 0 &&
      questions.every(({ state, optional }) => state !== 'open' || optional) &&
      each !== 'check'
      ? 'done'
      : 'open';
  };
  return (
    <Page>
      <chakra.p color="slate" fontSize="sm" marginBottom="2" role="status">
        {view.revision > 0 ? `Saved ${timeOf(view.updatedAt)}` : 'Every answer is saved at once'}
      </chakra.p>
      <StepList
        label="Steps of the measure-up"
        steps={steps.map((each, index) => {
          const first = view.questions.find((question) => question.step === each);
          const to = each === 'check' ? 'check' : first?.key;
          return {
            name: stepNames[each],
            state: stateOf(each, index),
            ...(to && view.revision > 0 ? { to: `/measure-up/${view.id}/${to}` } : {}),
          };
        })}
      />
      <chakra.div marginTop="6">{children}</chakra.div>
    </Page>
  );
}

export const stepOf = (step: Step): string =>
  `Step ${steps.indexOf(step) + 1} of ${steps.length} · ${stepNames[step]}`;

/** Form on the left, drawing on the right; on a telephone the drawing first. */
export const Beside = chakra('div', {
  base: {
    display: 'grid',
    gap: { base: '4', lg: '12' },
    gridTemplateColumns: { base: 'minmax(0, 1fr)', lg: 'minmax(0, 36rem) minmax(0, 1fr)' },
    alignItems: 'start',
  },
});

export const Sheet = chakra('div', {
  base: {
    bg: 'paper',
    borderWidth: '1px',
    borderColor: 'hair',
    borderRadius: 'card',
    padding: { base: '3', md: '6' },
    order: { base: '-1', lg: '0' },
    position: { lg: 'sticky' },
    top: { lg: '6' },
  },
});
