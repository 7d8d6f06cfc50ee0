import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { Notice } from '../../components/notice';
import { Page } from '../../components/page';
import { PageHeading } from '../../components/page-heading';

const Body = chakra('div', {
  base: {
    '& h2': {
      fontSize: 'xl',
      fontWeight: 'heavy',
      lineHeight: 'heading',
      marginTop: '10',
      _first: { marginTop: '0' },
      marginBottom: '2',
    },
    '& p + p, & ul + p, & ol + p, & table + p': { marginTop: '3' },
    '& ul': { listStyleType: 'disc', paddingLeft: '5', marginTop: '2' },
    '& ol': { listStyleType: 'decimal', paddingLeft: '5', marginTop: '2' },
    '& li': { paddingBlock: '0.5', paddingLeft: '1' },
    '& li::marker': { color: 'slate' },
  },
});

export interface CompanyPageProps {
  title: string;
  lead: string;
  children: ReactNode;
}

/** A page of plain text, with the notice that all of it is a demonstration. */
export function CompanyPage({ title, lead, children }: CompanyPageProps) {
  return (
    <Page>
      <PageHeading lead={lead}>{title}</PageHeading>
      <chakra.div
        display="grid"
        gridTemplateColumns={{ base: 'minmax(0, 1fr)', lg: 'minmax(0, 65ch) minmax(0, 22rem)' }}
        columnGap="16"
        rowGap="8"
        justifyContent="space-between"
        alignItems="start"
      >
        <chakra.div order={{ lg: 1 }} position={{ lg: 'sticky' }} top="6">
          <Notice tone="heather" title="This is a demonstration">
            Linkfell Ltd, its partners and its places are invented. Nothing can be bought here, no card is
            charged and no parcel is sent. The text shows what such a company would have to say; it is not
            legal advice.
          </Notice>
        </chakra.div>
        <Body>{children}</Body>
      </chakra.div>
    </Page>
  );
}
