import { chakra } from '@chakra-ui/react';
import { LinkButton } from '../components/link-button';
import { Page } from '../components/page';
import { PageHeading } from '../components/page-heading';
import { TextLink } from '../components/text-link';
import { LostPivot } from './lost-pivot';

export function NotFoundPage() {
  return (
    <Page width="text">
      <chakra.div marginBottom="5">
        <LostPivot />
      </chakra.div>
      <PageHeading
        above="Page not found"
        lead="There is nothing at this address. It may have moved, or a letter of it got lost."
      >
        This end is not connected
      </PageHeading>
      <chakra.p marginBottom="6">
        If you came for an order, <TextLink to="/find-order">find it by its reference</TextLink>.
      </chakra.p>
      <LinkButton to="/">Go to the front page</LinkButton>
    </Page>
  );
}
