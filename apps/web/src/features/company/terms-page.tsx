import { PageHeading } from '../../components/page-heading';
export const TermsPage = () => <PageHeading>Terms</PageHeading>;
