import { useQuery } from '@tanstack/react-query';
import { useEffect } from 'react';
import { useParams } from 'react-router-dom';
import { LinkButton } from '../../components/link-button';
import { Page } from '../../components/page';
import { PageHeading } from '../../components/page-heading';
import { Skeleton } from '../../components/skeleton';
import { measureUpQuery } from './api/measure-up';
import { CheckAnswers } from './components/check-answers';
import { FrameQuestion } from './components/frame-question';
import { QuestionForm } from './components/question-form';
import { remember } from './remembered';
import { LoadFailed } from '../../components/load-failed';

/** One route per question: /measure-up/:id/:question. */
export function QuestionPage() {
  const { id = '', question = '' } = useParams();
  const { data: view, error } = useQuery(measureUpQuery(id));
  useEffect(() => {
    if (view) remember(view.id);
  }, [view]);
  if (error)
    return (
      <LoadFailed
        error={error}
        what="these answers"
        next={{ to: '/measure-up', label: 'Start a measure-up' }}
      />
    );
  if (!view) {
    return (
      <Page width="form">
        <Skeleton lines={6} what="Loading your answers" />
      </Page>
    );
  }
  if (question === 'check') return <CheckAnswers view={view} />;
  const asked = view.questions.find(({ key }) => key === question);
  if (!asked) {
    return (
      <Page width="text">
        <PageHeading lead="With your answers so far this question does not arise.">
          Nothing to ask here
        </PageHeading>
        <LinkButton to={`/measure-up/${id}/check`}>Look at all answers</LinkButton>
      </Page>
    );
  }
  return asked.key === 'frame' ? (
    <FrameQuestion key={view.id} view={view} />
  ) : (
    <QuestionForm key={asked.key} view={view} questionKey={asked.key} />
  );
}
