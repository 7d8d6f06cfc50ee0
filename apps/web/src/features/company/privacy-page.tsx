import { chakra } from '@chakra-ui/react';
import { OuterLink } from '../../components/text-link';
import { company } from './company';
import { CompanyPage } from './company-page';

const kept: [string, string, string][] = [
  ['Your measure-up: figures, weight, riding, place', 'To find what fits', 'Until you ask us to delete it'],
  [
    'Your order: name, e-mail, address, what was bought and fitted',
    'To sell, send, fit and stand by it',
    'As long as tax law asks, six years as a rule',
  ],
  ['Payment', 'To take and refund money', 'Card numbers never reach us; the payment service keeps them'],
  ['Account and password', 'To sign in', 'Until the account is closed; the password only as a hash'],
  ['Failed sign-ins', 'To stop guessing', '2 days'],
  ['Links to set a new password', 'To let you back in', 'At most 7 days after they expire'],
  ['Repeated requests (their keys)', 'So that a second press does not buy twice', '7 days'],
  ['Messages waiting to be sent', 'To send each exactly once', '30 days after sending'],
];

const Cell = chakra('td', { base: { paddingBlock: '2', paddingRight: '4', verticalAlign: 'top' } });

function KeptTable() {
  return (
    <chakra.table width="full" marginTop="3" fontSize={{ base: 'sm', sm: 'md' }}>
      <thead>
        <tr>
          {['What', 'Why', 'How long'].map((head) => (
            <chakra.th key={head} scope="col" textAlign="left" paddingBottom="2" color="slate">
              {head}
            </chakra.th>
          ))}
        </tr>
      </thead>
      <tbody>
        {kept.map((row) => (
          <chakra.tr key={row[0]} borderTopWidth="1px" borderColor="hair">
            {row.map((text) => (
              <Cell key={text}>{text}</Cell>
            ))}
          </chakra.tr>
        ))}
      </tbody>
    </chakra.table>
  );
}

export function PrivacyPage() {
  return (
    <CompanyPage
      title="Privacy"
      lead="What we store, why, and for how long. We keep what the work needs and nothing to sell on."
    >
      <h2>What we keep</h2>
      <KeptTable />
      <h2>Who sees it</h2>
      <ul>
        <li>A shop sees its lines of your order and where to send them.</li>
        <li>A workshop sees the booking, the job sheet and how to reach you.</li>
        <li>The payment service sees what it needs to take the payment.</li>
        <li>
          Nobody else, unless a court orders it. There is no advertising and no tracking by others on these
          pages.
        </li>
      </ul>
      <h2>In your browser</h2>
      <p>
        One cookie ties your browser to your measure-up, your order or your account. It is needed for the
        pages to work, is sent to us only and ends after 60 days. Your choice of light or dark stays in the
        browser’s own storage.
      </p>
      <h2>Your rights</h2>
      <p>
        You may ask what we have about you, have it corrected, taken along or deleted, and object to its use.
        Orders that tax law makes us keep are locked instead of deleted. Write to{' '}
        <OuterLink href={`mailto:${company.privacyEmail}`}>{company.privacyEmail}</OuterLink>; we answer
        within a month. You may also complain to the data protection authority where you live.
      </p>
      <p>
        Responsible: {company.name}, {company.street}, {company.town}, {company.postcode}. As of 1 December
        2026.
      </p>
    </CompanyPage>
  );
}
