import { PageHeading } from '../../components/page-heading';
export const ReturnsPage = () => <PageHeading>Returns</PageHeading>;
