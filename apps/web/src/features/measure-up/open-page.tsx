import { useMutation } from '@tanstack/react-query';
import { useEffect, useRef } from 'react';
import { useLocation, useNavigate } from 'react-router-dom';
import { LinkButton } from '../../components/link-button';
import { Page } from '../../components/page';
import { PageHeading } from '../../components/page-heading';
import { Skeleton } from '../../components/skeleton';
import { openLink } from './api/measure-up';

/** A rider's own link: the token stands in the fragment, which no server ever sees, and is exchanged here. */
export function OpenPage() {
  const token = useLocation().hash.slice(1);
  const navigate = useNavigate();
  const open = useMutation({
    mutationFn: openLink,
    onSuccess: ({ id }) => void navigate(`/measure-up/${id}/check`, { replace: true }),
  });
  const { mutate } = open;
  const asked = useRef(false);
  useEffect(() => {
    if (asked.current) return;
    asked.current = true;
    mutate(token);
  }, [mutate, token]);
  if (open.isError) {
    return (
      <Page width="text">
        <PageHeading lead="It was revoked, or part of it was lost on the way.">
          This link opens nothing
        </PageHeading>
        <LinkButton to="/measure-up">Start a measure-up</LinkButton>
      </Page>
    );
  }
  return (
    <Page width="text">
      <PageHeading>Opening your answers</PageHeading>
      <Skeleton what="Opening your answers" />
    </Page>
  );
}
