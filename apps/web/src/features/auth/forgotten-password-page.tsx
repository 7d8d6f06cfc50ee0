import { resetRequestBody } from '@linkfell/contracts';
import { useState } from 'react';
import { SimpleForm } from '../../components/forms/simple-form';
import { Notice } from '../../components/notice';
import { Page } from '../../components/page';
import { PageHeading } from '../../components/page-heading';
import { usePageTitle } from '../../lib/page-title';
import { askReset } from './api';

/** Asks for a mail with a link; the answer never says whether the address is known. */
export function ForgottenPasswordPage() {
  const [done, setDone] = useState(false);
  const [faulty, setFaulty] = useState(false);
  usePageTitle('Forgotten password', { error: faulty });
  return (
    <Page width="form">
      <PageHeading lead="We send a link that works once, for half an hour.">
        Forgotten your password?
      </PageHeading>
      {done ? (
        <Notice tone="moss" announce="status" title="Look into your mail">
          <p>If an account has that address, a link is on its way.</p>
        </Notice>
      ) : (
        <SimpleForm
          schema={resetRequestBody}
          fields={[{ name: 'email', label: 'E-mail', input: { type: 'email', autoComplete: 'username' } }]}
          button="Send the link"
          busy="Sending"
          onFaults={setFaulty}
          send={async (body) => {
            await askReset(body);
            setDone(true);
          }}
        />
      )}
    </Page>
  );
}
