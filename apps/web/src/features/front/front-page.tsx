import { Page } from '../../components/page';
import { PageHeading } from '../../components/page-heading';
import { LinkButton } from '../../components/link-button';
export function FrontPage() {
  return (
    <Page>
      <PageHeading lead="x">Find the rear shock that fits your bike</PageHeading>
      <LinkButton to="/measure-up" size="large">
        Start your measure-up
      </LinkButton>
    </Page>
  );
}
