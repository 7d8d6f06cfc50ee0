import { steps, type MeasureUpView, type StoredAnswer } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { useMutation } from '@tanstack/react-query';
import { Button } from '../../../components/button';
import { LinkButton } from '../../../components/link-button';
import { Notice } from '../../../components/notice';
import { PageHeading } from '../../../components/page-heading';
import { TextLink } from '../../../components/text-link';
import { usePageTitle } from '../../../lib/page-title';
import { createLink, revokeLinks } from '../api/measure-up';
import { specs, stepNames } from '../specs/registry';
import { MeasureUpFrame, stepOf } from './measure-up-frame';

function words(view: MeasureUpView, key: (typeof view.questions)[number]['key']): string {
  const stored = view.answers[key] as StoredAnswer | undefined;
  if (!stored) return 'Not answered';
  if (stored.state === 'unknown') return 'I don’t know';
  const said = key === 'frame' ? view.title : specs[key].summary(stored.value as never);
  return said.charAt(0).toUpperCase() + said.slice(1);
}

/** All answers on one page, each with a way to change it, and the way on to the matches. */
export function CheckAnswers({ view }: { view: MeasureUpView }) {
  usePageTitle('Check your answers');
  const open = view.questions.filter(({ state, optional }) => state === 'open' && !optional);
  return (
    <MeasureUpFrame view={view} step="check">
      <PageHeading above={stepOf('check')}>Check your answers</PageHeading>
      {open.length > 0 ? (
        <chakra.div marginBottom="6" maxWidth="line">
          <Notice
            tone="heather"
            title={`${open.length === 1 ? 'One answer is' : `${open.length} answers are`} still open`}
          >
            <p>
              Matches are shown all the same; what is not known can turn them into “Needs an answer first”.
            </p>
          </Notice>
        </chakra.div>
      ) : null}
      {steps.map((step) => {
        const questions = view.questions.filter((question) => question.step === step);
        if (questions.length === 0) return null;
        return (
          <chakra.section key={step} marginBottom="8" maxWidth="46rem">
            <chakra.h2 fontSize="xl" fontWeight="heavy" marginBottom="2">
              {stepNames[step]}
            </chakra.h2>
            <chakra.dl borderTopWidth="2px" borderColor="ink">
              {questions.map(({ key, state }) => {
                const title = key === 'frame' ? 'Which frame is it?' : specs[key].title;
                return (
                  <chakra.div
                    key={key}
                    display="grid"
                    gridTemplateColumns={{ base: '1fr auto', md: '1fr 1fr auto' }}
                    columnGap="4"
                    alignItems="center"
                    borderBottomWidth="1px"
                    borderColor="hair"
                    paddingBlock="2"
                  >
                    <chakra.dt color="slate">{title}</chakra.dt>
                    <chakra.dd
                      fontWeight="bold"
                      gridRow={{ base: '2', md: 'auto' }}
                      color={state === 'known' ? 'ink' : 'slate'}
                    >
                      {words(view, key)}
                    </chakra.dd>
                    <chakra.dd gridRow={{ base: '1 / span 2', md: 'auto' }}>
                      <TextLink
                        to={`/measure-up/${view.id}/${key}`}
                        display="inline-flex"
                        alignItems="center"
                        minHeight="target"
                      >
                        {state === 'open' ? 'Answer' : 'Change'}
                        <chakra.span srOnly>: {title}</chakra.span>
                      </TextLink>
                    </chakra.dd>
                  </chakra.div>
                );
              })}
            </chakra.dl>
          </chakra.section>
        );
      })}
      {view.readyForMatches ? (
        <LinkButton to={`/measure-up/${view.id}/matches`} size="large">
          Show what fits
        </LinkButton>
      ) : (
        <LinkButton to={`/measure-up/${view.id}/frame`} size="large">
          Choose your frame first
        </LinkButton>
      )}
      <OwnLink id={view.id} />
    </MeasureUpFrame>
  );
}

/** The rider's own link to carry on elsewhere. */
function OwnLink({ id }: { id: string }) {
  const link = useMutation({ mutationFn: () => createLink(id) });
  const revoke = useMutation({ mutationFn: () => revokeLinks(id), onSuccess: () => link.reset() });
  return (
    <chakra.section marginTop="10" maxWidth="46rem">
      <chakra.h2 fontSize="lg">Carry on elsewhere</chakra.h2>
      <chakra.p color="slate" marginBottom="3">
        A link opens these answers on another device. Whoever has it can change them, until you revoke it.
      </chakra.p>
      {link.data ? (
        <chakra.p wordBreak="break-all" marginBottom="3" role="status">
          <strong>Your link:</strong> {link.data.url}
        </chakra.p>
      ) : null}
      {revoke.isSuccess && !link.data ? <p role="status">All links to these answers are revoked.</p> : null}
      <chakra.div display="flex" flexWrap="wrap" gap="3">
        <Button tone="plain" busy={link.isPending && 'Making the link'} onClick={() => link.mutate()}>
          Make a link
        </Button>
        <Button tone="quiet" busy={revoke.isPending && 'Revoking'} onClick={() => revoke.mutate()}>
          Revoke all links
        </Button>
      </chakra.div>
    </chakra.section>
  );
}
