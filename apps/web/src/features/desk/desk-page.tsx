import { chakra } from '@chakra-ui/react';
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { Navigate, useNavigate } from 'react-router-dom';
import { Button } from '../../components/button';
import { LinkButton } from '../../components/link-button';
import { LoadFailed } from '../../components/load-failed';
import { Page } from '../../components/page';
import { PageHeading } from '../../components/page-heading';
import { Skeleton } from '../../components/skeleton';
import { meQuery, signOut } from '../auth/api';

/** Home of everybody who has signed in: what is theirs to do. */
export function DeskPage() {
  const { data, error } = useQuery(meQuery);
  const navigate = useNavigate();
  const queries = useQueryClient();
  const leave = useMutation({
    mutationFn: signOut,
    onSuccess: () => {
      queries.clear();
      void navigate('/');
    },
  });
  if (error) return <LoadFailed error={error} what="your desk" />;
  if (!data) {
    return (
      <Page>
        <PageHeading>Your desk</PageHeading>
        <Skeleton what="Loading your desk" />
      </Page>
    );
  }
  const { account } = data;
  if (!account) return <Navigate to="/sign-in" replace />;
  return (
    <Page>
      <PageHeading lead={`Signed in as ${account.displayName}, ${account.email}.`}>Your desk</PageHeading>
      {account.organisations.map((organisation) => (
        <chakra.section
          key={organisation.id}
          borderTopWidth="2px"
          borderColor="ink"
          paddingTop="4"
          marginBottom="8"
        >
          <chakra.h2 fontSize="xl" fontWeight="heavy">
            {organisation.name}
          </chakra.h2>
          <chakra.p color="slate" marginBottom="4">
            You are its {organisation.role}.
          </chakra.p>
          <chakra.div display="flex" flexWrap="wrap" gap="3">
            {organisation.isWorkshop ? (
              <LinkButton to={`/desk/${organisation.id}/bookings`}>Fittings</LinkButton>
            ) : null}
            {organisation.isShop ? (
              <LinkButton to={`/desk/${organisation.id}/parcels`}>Parcels</LinkButton>
            ) : null}
            {organisation.isShop ? (
              <LinkButton tone="plain" to={`/desk/${organisation.id}/stock`}>
                Stock
              </LinkButton>
            ) : null}
          </chakra.div>
        </chakra.section>
      ))}
      {account.organisations.length === 0 ? (
        <chakra.div marginBottom="8" display="flex" flexWrap="wrap" gap="3">
          <LinkButton to="/measure-up">Your measure-up</LinkButton>
          <LinkButton tone="plain" to="/find-order">
            Find my order
          </LinkButton>
        </chakra.div>
      ) : null}
      <Button tone="plain" busy={leave.isPending && 'Signing out'} onClick={() => leave.mutate()}>
        Sign out
      </Button>
    </Page>
  );
}
