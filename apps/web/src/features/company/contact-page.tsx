import { PageHeading } from '../../components/page-heading';
export const ContactPage = () => <PageHeading>Contact</PageHeading>;
