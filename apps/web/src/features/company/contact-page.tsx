import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { OuterLink, TextLink } from '../../components/text-link';
import { company } from './company';
import { CompanyPage } from './company-page';

const Row = ({ label, children }: { label: string; children: ReactNode }) => (
  <chakra.div
    display="grid"
    gridTemplateColumns={{ base: '1fr', sm: '10rem 1fr' }}
    paddingBlock="3"
    borderTopWidth="1px"
    borderColor="hair"
  >
    <chakra.dt color="slate" fontWeight="medium">
      {label}
    </chakra.dt>
    <dd>{children}</dd>
  </chakra.div>
);

const Mail = ({ to }: { to: string }) => <OuterLink href={`mailto:${to}`}>{to}</OuterLink>;

export function ContactPage() {
  return (
    <CompanyPage title="Contact" lead="People answer, on working days within one day.">
      <h2>Reach us</h2>
      <chakra.dl marginTop="3" borderBottomWidth="1px" borderColor="hair">
        <Row label="E-mail">
          <Mail to={company.email} />
        </Row>
        <Row label="Telephone">
          <OuterLink href={`tel:+44${company.phone.replace(/^0|\s/g, '')}`}>{company.phone}</OuterLink>
          <chakra.span display="block" color="slate" fontSize="sm">
            {company.hours}
          </chakra.span>
        </Row>
        <Row label="Post">
          {company.name}
          <br />
          {company.street}
          <br />
          {company.town}, {company.district}
          <br />
          {company.postcode}
        </Row>
        <Row label="Shops and workshops">
          <Mail to={company.partnersEmail} />
          <chakra.span display="block" color="slate" fontSize="sm">
            Say where you are, whether you sell, fit or both, and how many stands you have.
          </chakra.span>
        </Row>
        <Row label="Company">
          Number {company.companyNumber}, VAT {company.vatNumber}
        </Row>
      </chakra.dl>
      <h2>Before you write</h2>
      <ul>
        <li>
          About an order: <TextLink to="/find-order">find it</TextLink> first. Its page says what happens
          next, and has the reference that we shall ask for.
        </li>
        <li>Something knocks, leaks or came loose: stop riding, then call.</li>
        <li>A figure on a frame or shock is wrong: tell us which one, and where the right one is printed.</li>
        <li>
          To send something back: <TextLink to="/returns">how returns work</TextLink>.
        </li>
      </ul>
    </CompanyPage>
  );
}
