import type { WorkshopRow } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { Link } from 'react-router-dom';
import { Field } from '../../components/forms/field';
import { Select } from '../../components/forms/select';
import { LoadFailed } from '../../components/load-failed';
import { Notice } from '../../components/notice';
import { Page } from '../../components/page';
import { PageHeading } from '../../components/page-heading';
import { Skeleton } from '../../components/skeleton';
import { TextLink } from '../../components/text-link';
import { formatFigure } from '../../lib/format-figure';
import { formatMoney } from '../../lib/format-money';
import { workshopsQuery } from './api';
import { closureDaysShort } from './closed-words';
import { PlaceMap } from './place-map';
import { openDaysWords } from './week';

const Name = chakra(Link, {
  base: {
    display: 'inline-flex',
    alignItems: 'center',
    minHeight: 'target',
    fontSize: 'lg',
    fontWeight: 'heavy',
    color: 'ink',
    textDecoration: 'underline',
    textDecorationColor: 'rule',
    textDecorationThickness: '1px',
    textUnderlineOffset: '0.2em',
    _hover: { textDecorationColor: 'bracken' },
  },
});

/** Every partner workshop, nearest first once a town is chosen. */
export function WorkshopsPage() {
  const [search, setSearch] = useSearchParams();
  const from = search.get('from') ?? '';
  const { data, error } = useQuery(workshopsQuery(from));
  if (error) {
    return (
      <LoadFailed
        error={error}
        what="these workshops"
        gone="There is no town of that name in the list."
        next={{ to: '/workshops', label: 'Look at all workshops' }}
      />
    );
  }
  return (
    <Page>
      <PageHeading lead="Workshops that fit what you choose. Nothing is sent to one before it has accepted your fitting.">
        Workshops
      </PageHeading>
      {data ? (
        <chakra.div
          display="grid"
          gridTemplateColumns={{ base: 'minmax(0, 1fr)', lg: 'minmax(0, 1fr) 26rem' }}
          columnGap="12"
          rowGap="6"
          alignItems="start"
        >
          <chakra.div order={{ lg: 1 }} position={{ lg: 'sticky' }} top="6" maxWidth="30rem">
            <Field id="from" label="Distances from">
              {(control) => (
                <Select
                  {...control}
                  value={from}
                  onChange={({ target }) =>
                    setSearch(target.value ? { from: target.value } : {}, { replace: true })
                  }
                >
                  <option value="">Choose your nearest town</option>
                  {data.towns.map(({ id, name }) => (
                    <option key={id} value={id}>
                      {name}
                    </option>
                  ))}
                </Select>
              )}
            </Field>
            <chakra.div bg="paper" borderWidth="1px" borderColor="rule" borderRadius="card" padding="3">
              <PlaceMap towns={data.towns} workshops={data.workshops} from={from} />
            </chakra.div>
          </chakra.div>
          <Rows workshops={data.workshops} />
        </chakra.div>
      ) : (
        <Skeleton lines={10} what="Loading workshops" />
      )}
      <chakra.p marginTop="10" maxWidth="line">
        Prices include VAT. What your bike needs, and when each workshop is free, comes out of{' '}
        <TextLink to="/measure-up">a measure-up</TextLink>: only then is the work named, and the time with it.
      </chakra.p>
    </Page>
  );
}

function Rows({ workshops }: { workshops: readonly WorkshopRow[] }) {
  if (workshops.length === 0) {
    return (
      <Notice title="No workshop is with us yet">
        <p>Shocks that need no press tool can be fitted by yourself.</p>
      </Notice>
    );
  }
  return (
    <chakra.ol listStyleType="none" borderTopWidth="2px" borderColor="ink">
      {workshops.map((workshop, index) => (
        <WorkshopLine key={workshop.id} workshop={workshop} number={index + 1} />
      ))}
    </chakra.ol>
  );
}

function WorkshopLine({ workshop, number }: { workshop: WorkshopRow; number: number }) {
  const { id, name, town, about, distanceKm, fitMinor, fitMinutes, works, openWeekdays, closure } = workshop;
  return (
    <chakra.li
      display="grid"
      gridTemplateColumns={{ base: '2.25rem minmax(0, 1fr)', sm: '2.25rem minmax(0, 1fr) 9rem' }}
      columnGap="3"
      rowGap="1"
      paddingBlock="4"
      borderBottomWidth="1px"
      borderColor="hair"
      fontVariantNumeric="tabular-nums"
    >
      <chakra.span aria-hidden="true" color="tarn" fontWeight="heavy" fontSize="lg" paddingTop="2">
        {number}
      </chakra.span>
      <div>
        <Name to={`/workshops/${id}`}>{name}</Name>
        <chakra.p color="slate" lineHeight="heading">
          {town}
          {distanceKm === null ? '' : `, ${formatFigure(distanceKm, 0)} km as the crow flies`}
        </chakra.p>
        <chakra.p marginTop="2" maxWidth="line">
          {about}
        </chakra.p>
        <chakra.p marginTop="1" fontSize="sm" color="slate">
          Open {openDaysWords(openWeekdays)}.{' '}
          {works.includes('travel-spacer') ? 'Opens dampers for travel spacers.' : 'Does not open dampers.'}
          {closure ? ` Next closed ${closureDaysShort(closure)}.` : ''}
        </chakra.p>
      </div>
      <chakra.p
        gridColumn={{ base: '2', sm: 'auto' }}
        textAlign={{ sm: 'right' }}
        lineHeight="heading"
        paddingTop={{ sm: '2' }}
      >
        <chakra.span fontWeight="heavy" fontSize="lg">
          {fitMinor === null ? '–' : formatMoney(fitMinor)}
        </chakra.span>
        <chakra.span display={{ base: 'inline', sm: 'block' }} color="slate" fontSize="sm">
          {' '}
          {fitMinutes === null ? 'fits no shocks' : `to fit a shock, ${fitMinutes} min`}
        </chakra.span>
      </chakra.p>
    </chakra.li>
  );
}
