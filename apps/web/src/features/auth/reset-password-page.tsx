import { newPassword } from '@linkfell/contracts';
import { useState } from 'react';
import { useLocation } from 'react-router-dom';
import { z } from 'zod';
import { SimpleForm } from '../../components/forms/simple-form';
import { LinkButton } from '../../components/link-button';
import { Notice } from '../../components/notice';
import { Page } from '../../components/page';
import { PageHeading } from '../../components/page-heading';
import { usePageTitle } from '../../lib/page-title';
import { confirmReset } from './api';

const schema = z.object({ password: newPassword });

/** Behind the link of the mail; its token stands in the fragment, which no server log ever sees. */
export function ResetPasswordPage() {
  const token = useLocation().hash.slice(1);
  const [done, setDone] = useState(false);
  const [faulty, setFaulty] = useState(false);
  usePageTitle('New password', { error: faulty });
  return (
    <Page width="form">
      <PageHeading lead="You will be signed out everywhere else.">Set a new password</PageHeading>
      {done ? (
        <>
          <Notice tone="moss" announce="status" title="Your password is changed">
            <p>Sign in with the new one.</p>
          </Notice>
          <LinkButton to="/sign-in" marginTop="6">
            Sign in
          </LinkButton>
        </>
      ) : (
        <SimpleForm
          schema={schema}
          fields={[
            {
              name: 'password',
              label: 'New password',
              hint: '15 characters or more; a few words you can remember do well',
              input: { type: 'password', autoComplete: 'new-password' },
            },
          ]}
          button="Set the password"
          busy="Setting"
          onFaults={setFaulty}
          send={async ({ password }) => {
            await confirmReset({ token, password });
            setDone(true);
          }}
        />
      )}
    </Page>
  );
}
