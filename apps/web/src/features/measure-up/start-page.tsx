import { chakra } from '@chakra-ui/react';
import { useMutation, useQuery } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { Button } from '../../components/button';
import { LinkButton } from '../../components/link-button';
import { Notice } from '../../components/notice';
import { Page } from '../../components/page';
import { PageHeading } from '../../components/page-heading';
import { isApiProblem } from '../../lib/api-problem';
import { createMeasureUp, measureUpQuery } from './api/measure-up';
import { remembered } from './remembered';

/** The door to the measure-up: start one, or carry on with the last. */
export function StartPage() {
  const navigate = useNavigate();
  const last = remembered();
  const old = useQuery({ ...measureUpQuery(last ?? ''), enabled: last !== null, retry: false });
  const start = useMutation({
    mutationFn: createMeasureUp,
    onSuccess: (view) => void navigate(`/measure-up/${view.id}/frame`),
  });
  return (
    <Page width="text">
      <PageHeading lead="Five steps: your frame, your present shock, the spring, you and your riding, and a check at the end. Have the bike beside you, and a caliper if you own one.">
        Your measure-up
      </PageHeading>
      <ul>
        <chakra.li marginBottom="2">Every answer is kept at once; close the page and come back.</chakra.li>
        <chakra.li marginBottom="2">“I don’t know” is an answer, and we say what follows from it.</chakra.li>
        <chakra.li marginBottom="6">No account, no e-mail address until you buy something.</chakra.li>
      </ul>
      {start.error ? (
        <chakra.div marginBottom="4">
          <Notice tone="brick" announce="alert" title="That did not work">
            <p>
              {isApiProblem(start.error)
                ? (start.error.detail ?? start.error.title)
                : 'Try again in a moment.'}
            </p>
          </Notice>
        </chakra.div>
      ) : null}
      <chakra.div display="flex" flexWrap="wrap" gap="3">
        {old.data ? (
          <LinkButton size="large" to={`/measure-up/${old.data.id}/${old.data.next ?? 'check'}`}>
            Carry on: {old.data.title}
          </LinkButton>
        ) : null}
        <Button
          size="large"
          tone={old.data ? 'plain' : 'primary'}
          busy={start.isPending && 'Starting'}
          onClick={() => start.mutate()}
        >
          {old.data ? 'Start a new one' : 'Start'}
        </Button>
      </chakra.div>
    </Page>
  );
}
