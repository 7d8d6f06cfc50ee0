import type { WorkshopPage as WorkshopView } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useParams } from 'react-router-dom';
import { LinkButton } from '../../components/link-button';
import { LoadFailed } from '../../components/load-failed';
import { Notice } from '../../components/notice';
import { Page } from '../../components/page';
import { PageHeading } from '../../components/page-heading';
import { Part } from '../../components/part';
import { Skeleton } from '../../components/skeleton';
import { OuterLink, TextLink } from '../../components/text-link';
import { formatMoneyExact } from '../../lib/format-money';
import { usePageTitle } from '../../lib/page-title';
import { workshopQuery, workshopsQuery } from './api';
import { closureDays, isNear } from './closed-words';
import { PlaceMap } from './place-map';
import { weekOf } from './week';

const Row = chakra('tr', {
  base: {
    '& > *': {
      borderTopWidth: '1px',
      borderColor: 'hair',
      paddingBlock: '2',
      verticalAlign: 'top',
      lineHeight: 'heading',
    },
    '& > th': { textAlign: 'left', fontWeight: 'medium', paddingRight: '4' },
    '& > td': { textAlign: 'right', whiteSpace: 'nowrap', paddingLeft: '3' },
  },
});
const Head = chakra('th', {
  base: {
    color: 'slate',
    fontSize: 'sm',
    fontWeight: 'bold',
    textAlign: 'right',
    paddingBottom: '2',
    _first: { textAlign: 'left' },
  },
});
const Table = chakra('table', { base: { width: 'full', borderBottomWidth: '1px', borderColor: 'hair' } });

/** One workshop: its work with prices, its hours and closures, and where it is. */
export function WorkshopPage() {
  const { workshopId = '' } = useParams();
  const [opened] = useState(() => new Date());
  const { data: workshop, error } = useQuery(workshopQuery(workshopId));
  usePageTitle(workshop?.name ?? 'One workshop');
  if (error) {
    return (
      <LoadFailed
        error={error}
        what="this workshop"
        gone="No workshop has this address. It may have left us."
        next={{ to: '/workshops', label: 'Look at all workshops' }}
      />
    );
  }
  const above = (
    <TextLink to="/workshops" display="inline-flex" alignItems="center" minHeight="target">
      Workshops
    </TextLink>
  );
  if (!workshop) {
    return (
      <Page>
        <PageHeading above={above}>One workshop</PageHeading>
        <Skeleton lines={8} what="Loading the workshop" />
      </Page>
    );
  }
  const near = workshop.closures.filter((closure) => isNear(closure, opened));
  return (
    <Page>
      <PageHeading above={above} lead={workshop.about}>
        {workshop.name}
      </PageHeading>
      {near.map((closure) => (
        <chakra.div key={closure.firstDay} marginBottom="3">
          <Notice tone="gorse" title={`Closed ${closureDays(closure)}`}>
            <p>{closure.reason}. No fittings on these days.</p>
          </Notice>
        </chakra.div>
      ))}
      <chakra.div
        display="grid"
        gridTemplateColumns={{ base: 'minmax(0, 1fr)', lg: 'minmax(0, 1fr) 24rem' }}
        columnGap="12"
        alignItems="start"
      >
        <div>
          <Part title="Work and prices" note="VAT included. Parts come on top.">
            <Services workshop={workshop} />
          </Part>
          <Part title="Hours" note={`Times where the workshop is (${workshop.timeZone}).`}>
            <Hours workshop={workshop} />
          </Part>
          {workshop.closures.length > 0 ? (
            <Part title="Closed for longer">
              <Closures workshop={workshop} />
            </Part>
          ) : null}
        </div>
        <div>
          <Part title="Where it is">
            <Where workshop={workshop} />
          </Part>
        </div>
      </chakra.div>
      <Part title="Have a shock fitted here">
        <p>
          Start with your bike: the measure-up finds what fits and which work it takes. Then choose this
          workshop in your plan, and one of its free times.
        </p>
        <LinkButton to="/measure-up" marginTop="4">
          Start your measure-up
        </LinkButton>
      </Part>
    </Page>
  );
}

function Services({ workshop }: { workshop: WorkshopView }) {
  return (
    <>
      <Table>
        <chakra.caption srOnly>Work, minutes and prices</chakra.caption>
        <thead>
          <tr>
            <Head scope="col">Work</Head>
            <Head scope="col">Minutes</Head>
            <Head scope="col">Price</Head>
          </tr>
        </thead>
        <tbody>
          {workshop.services.map(({ workId, say, minutes, priceMinor }) => (
            <Row key={workId}>
              <th scope="row">{say}</th>
              <td>{minutes}</td>
              <chakra.td fontWeight="bold">{formatMoneyExact(priceMinor)}</chakra.td>
            </Row>
          ))}
        </tbody>
      </Table>
      <chakra.p color="slate" marginTop="3">
        {workshop.stands === 1 ? '1 stand' : `${workshop.stands} stands`}.
        {workshop.works.includes('travel-spacer')
          ? ''
          : ' Travel spacers are not fitted here: that means opening a damper.'}
      </chakra.p>
    </>
  );
}

function Hours({ workshop }: { workshop: WorkshopView }) {
  return (
    <Table>
      <chakra.caption srOnly>Opening hours</chakra.caption>
      <tbody>
        {weekOf(workshop.hours).map(({ day, spans }) => (
          <Row key={day}>
            <th scope="row">{day}</th>
            <chakra.td
              color={spans.length === 0 ? 'slate' : 'ink'}
              fontWeight={spans.length === 0 ? 'normal' : 'bold'}
            >
              {spans.length === 0
                ? 'closed'
                : spans.map((span) => (
                    <chakra.span key={span} display="block">
                      {span}
                    </chakra.span>
                  ))}
            </chakra.td>
          </Row>
        ))}
      </tbody>
    </Table>
  );
}

function Closures({ workshop }: { workshop: WorkshopView }) {
  return (
    <Table>
      <chakra.caption srOnly>Closures, the next one first</chakra.caption>
      <tbody>
        {workshop.closures.map((closure) => (
          <Row key={closure.firstDay}>
            <th scope="row">{closureDays(closure)}</th>
            <chakra.td css={{ '&&': { whiteSpace: 'normal' } }}>{closure.reason}</chakra.td>
          </Row>
        ))}
      </tbody>
    </Table>
  );
}

function Where({ workshop }: { workshop: WorkshopView }) {
  const { data } = useQuery(workshopsQuery(''));
  const { id, name, street, town, postcode, phone, email, vatNumber } = workshop;
  return (
    <>
      <chakra.address fontStyle="normal">
        {street}
        <br />
        {town}
        <br />
        {postcode}
      </chakra.address>
      <chakra.p marginTop="2">
        <OuterLink
          href={`tel:${phone.replaceAll(' ', '')}`}
          display="inline-flex"
          alignItems="center"
          minHeight="target"
        >
          {phone}
        </OuterLink>
        <br />
        <OuterLink
          href={`mailto:${email}`}
          display="inline-flex"
          alignItems="center"
          minHeight="target"
          overflowWrap="anywhere"
        >
          {email}
        </OuterLink>
      </chakra.p>
      <chakra.p color="slate" fontSize="sm">
        VAT {vatNumber}
      </chakra.p>
      {data ? (
        <chakra.div
          bg="paper"
          borderWidth="1px"
          borderColor="rule"
          borderRadius="card"
          padding="3"
          marginTop="4"
          maxWidth="30rem"
        >
          <PlaceMap towns={data.towns} workshops={data.workshops} chosen={id} />
          <chakra.p
            fontSize="sm"
            color="slate"
            borderTopWidth="1px"
            borderColor="hair"
            paddingTop="2"
            marginTop="2"
          >
            {name} is number {data.workshops.findIndex((each) => each.id === id) + 1}. Drawn to scale, north
            up.
          </chakra.p>
        </chakra.div>
      ) : null}
    </>
  );
}
