import type { ReactNode } from 'react';
import { chakra } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { LoadFailed } from '../../components/load-failed';
import { Page } from '../../components/page';
import { PageHeading } from '../../components/page-heading';
import { Skeleton } from '../../components/skeleton';
import { TextLink } from '../../components/text-link';
import { isApiProblem } from '../../lib/api-problem';
import { usePageTitle } from '../../lib/page-title';
import { meQuery } from '../auth/api';

/** The frame of a page at the desk of one organisation. */
export function DeskFrame({
  title,
  error,
  ready,
  children,
}: {
  title: string;
  error: Error | null;
  ready: boolean;
  children: ReactNode;
}) {
  const { orgId = '' } = useParams();
  const { data } = useQuery(meQuery);
  const name = data?.account?.organisations.find(({ id }) => id === orgId)?.name;
  usePageTitle(name ? `${title}, ${name}` : title);
  if (error) {
    return (
      <LoadFailed
        error={error}
        what="this page of the desk"
        next={
          isApiProblem(error) && error.status === 401
            ? { to: '/sign-in', label: 'Sign in' }
            : { to: '/desk', label: 'Your desk' }
        }
      />
    );
  }
  return (
    <Page>
      <chakra.p marginBottom="2">
        <TextLink to="/desk" display="inline-flex" alignItems="center" minHeight="target">
          Your desk
        </TextLink>
      </chakra.p>
      <PageHeading above={name}>{title}</PageHeading>
      {ready ? children : <Skeleton lines={6} what={`Loading ${title.toLowerCase()}`} />}
    </Page>
  );
}
