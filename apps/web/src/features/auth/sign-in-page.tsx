import { signInBody } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Navigate, useNavigate } from 'react-router-dom';
import { SimpleForm } from '../../components/forms/simple-form';
import { Page } from '../../components/page';
import { PageHeading } from '../../components/page-heading';
import { TextLink } from '../../components/text-link';
import { isApiProblem } from '../../lib/api-problem';
import { usePageTitle } from '../../lib/page-title';
import { meQuery, signIn } from './api';

const wrong = 'No account has this e-mail address and password together';

/** For shops, workshops and riders with an account. */
export function SignInPage() {
  const navigate = useNavigate();
  const queries = useQueryClient();
  const { data } = useQuery(meQuery);
  const [faulty, setFaulty] = useState(false);
  usePageTitle('Sign in', { error: faulty });
  if (data?.account) return <Navigate to="/desk" replace />;
  return (
    <Page width="form">
      <PageHeading lead="For shops, workshops and riders with an account. To buy a shock you need none.">
        Sign in
      </PageHeading>
      <SimpleForm
        schema={signInBody}
        fields={[
          { name: 'email', label: 'E-mail', input: { type: 'email', autoComplete: 'username' } },
          {
            name: 'password',
            label: 'Password',
            input: { type: 'password', autoComplete: 'current-password' },
          },
        ]}
        button="Sign in"
        busy="Signing in"
        onFaults={setFaulty}
        describe={(error) => (isApiProblem(error) && error.status === 401 ? wrong : undefined)}
        send={async (body) => {
          queries.setQueryData(meQuery.queryKey, await signIn(body));
          void navigate('/desk');
        }}
      />
      <chakra.p marginTop="6">
        <TextLink to="/forgotten-password" display="inline-flex" alignItems="center" minHeight="target">
          Forgotten your password?
        </TextLink>
      </chakra.p>
    </Page>
  );
}
