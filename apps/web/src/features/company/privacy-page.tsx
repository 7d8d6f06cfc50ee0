import { PageHeading } from '../../components/page-heading';
export const PrivacyPage = () => <PageHeading>Privacy</PageHeading>;
