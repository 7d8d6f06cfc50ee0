import type { OrderView } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useParams, useSearchParams } from 'react-router-dom';
import { Bill } from '../../components/bill';
import { Button } from '../../components/button';
import { Cautions } from '../../components/cautions';
import { ChoiceGroup } from '../../components/forms/choice-group';
import { LinkButton } from '../../components/link-button';
import { LoadFailed } from '../../components/load-failed';
import { Notice } from '../../components/notice';
import { Page } from '../../components/page';
import { PageHeading } from '../../components/page-heading';
import { Skeleton } from '../../components/skeleton';
import { SlotPicker } from '../../components/slot-picker';
import { SpecTable } from '../../components/spec-table';
import { OuterLink, TextLink } from '../../components/text-link';
import { VerdictBadge } from '../../components/verdict-badge';
import { isApiProblem } from '../../lib/api-problem';
import { formatDateTime, formatTime } from '../../lib/format-date';
import { formatMoneyExact } from '../../lib/format-money';
import { usePageTitle } from '../../lib/page-title';
import { orderQuery, rebookQuery, useOrderAction } from './api';
import { Timeline } from './timeline';

const Section = chakra('section', {
  base: { borderTopWidth: '2px', borderColor: 'ink', paddingTop: '5', marginBottom: '8' },
});
const Title = chakra('h2', { base: { fontSize: 'xl', fontWeight: 'heavy', marginBottom: '3' } });

/** An order as a timeline, from paid to set up. */
export function OrderPage() {
  const { reference = '' } = useParams();
  const { data: order, error } = useQuery(orderQuery(reference));
  usePageTitle(`Order ${reference}`);
  if (error)
    return (
      <LoadFailed error={error} what="this order" next={{ to: '/find-order', label: 'Find my order' }} />
    );
  if (!order) {
    return (
      <Page>
        <PageHeading>Order {reference}</PageHeading>
        <Skeleton lines={8} what="Loading your order" />
      </Page>
    );
  }
  return <Order order={order} />;
}

function Order({ order }: { order: OrderView }) {
  const act = useOrderAction(order.reference);
  return (
    <Page css={{ '& > *': { maxWidth: '56rem' } }}>
      <PageHeading above={`Order ${order.reference}`} lead={order.next}>
        {order.shockName}
      </PageHeading>
      <chakra.div marginBottom="6" display="flex" flexWrap="wrap" gap="3" alignItems="center">
        <VerdictBadge verdict={order.verdict} />
        <chakra.span color="slate">{order.title}</chakra.span>
      </chakra.div>
      <ComingBack order={order} />
      {act.error ? (
        <chakra.div marginBottom="6">
          <Notice
            tone="brick"
            announce="alert"
            title={isApiProblem(act.error) ? act.error.title : 'That did not work'}
          >
            <p>
              {isApiProblem(act.error)
                ? (act.error.detail ?? 'Look at the order again.')
                : 'Try again in a moment.'}
            </p>
          </Notice>
        </chakra.div>
      ) : null}
      <Payment order={order} act={act} />
      {order.actions.includes('choose-workshop') ? <ChooseAgain order={order} act={act} /> : null}
      <Section>
        <Title>What happens when</Title>
        <Timeline events={order.timeline} zone={order.booking?.timeZone} />
      </Section>
      <Booking order={order} />
      <WhatWasSet order={order} />
      {order.parcels.length > 0 && order.state !== 'released' ? (
        <Section>
          <Title>Parcels</Title>
          {order.parcels.map((parcel) => (
            <chakra.p key={parcel.shopName} marginBottom="3">
              <strong>{parcel.shopName}</strong>: {parcelWords[parcel.state]}
              {parcel.tracking ? `, ${parcel.tracking}` : ''}. To {parcel.to.join(', ')}.{' '}
              {parcel.items.join('; ')}.
            </chakra.p>
          ))}
        </Section>
      ) : null}
      <Section>
        <Title>What you bought</Title>
        <Bill {...order} />
        {order.refundedMinor > 0 ? <p>Refunded: {formatMoneyExact(order.refundedMinor)}</p> : null}
      </Section>
      {order.actions.includes('refund') ? <Refund act={act} /> : null}
      <Section>
        <Cautions lines={order.cautions} />
        <chakra.p marginTop="4">
          Questions? Write to <OuterLink href="mailto:help@linkfell.example">help@linkfell.example</OuterLink>{' '}
          with the reference {order.reference}. See also{' '}
          <TextLink to="/returns">returns and refunds</TextLink>.
        </chakra.p>
      </Section>
    </Page>
  );
}

const parcelWords: Record<OrderView['parcels'][number]['state'], string> = {
  held: 'held until you have paid',
  waiting: 'waits for the workshop’s answer',
  'to-send': 'is being got ready',
  sent: 'sent',
  cancelled: 'cancelled',
};

type Act = ReturnType<typeof useOrderAction>;

/** What the payment page sent the rider back with; it decides nothing, the order's own state does. */
function ComingBack({ order }: { order: OrderView }) {
  const [search] = useSearchParams();
  if (search.has('paid') && order.state === 'held') {
    return (
      <chakra.div marginBottom="6">
        <Notice announce="status" title="Waiting for the payment to be confirmed">
          <p>This takes a few seconds. You can close this page; we write to {order.email}.</p>
        </Notice>
      </chakra.div>
    );
  }
  if (search.has('paid') && order.state === 'paid') {
    return (
      <chakra.div marginBottom="6">
        <Notice tone="moss" announce="status" title={`Paid: ${order.reference}`}>
          <p>A confirmation is on its way to {order.email}.</p>
        </Notice>
      </chakra.div>
    );
  }
  return null;
}

function Payment({ order, act }: { order: OrderView; act: Act }) {
  const [search] = useSearchParams();
  if (order.state === 'held') {
    return (
      <Section>
        <Title>{search.has('cancelled') ? 'You have not paid yet' : 'Not paid yet'}</Title>
        <chakra.p marginBottom="4">
          Stock and date are held for you until {formatTime(order.holdExpiresAt)}. You can pay now, with
          another card if one was declined, or let the hold go.
        </chakra.p>
        <chakra.div display="flex" flexWrap="wrap" gap="3">
          {order.paymentUrl ? (
            <Button size="large" onClick={() => window.location.assign(order.paymentUrl ?? '')}>
              Pay {formatMoneyExact(order.totalMinor)}
            </Button>
          ) : null}
          <Button
            tone="plain"
            size="large"
            busy={act.isPending && 'Letting go'}
            onClick={() => act.mutate({ path: 'cancel-payment' })}
          >
            Let the hold go
          </Button>
        </chakra.div>
      </Section>
    );
  }
  if (order.state === 'released') {
    return (
      <Section>
        <Title>Nothing was paid</Title>
        <chakra.p marginBottom="4">
          {order.releaseReason === 'expired' ? 'The time to pay ran out.' : 'The hold was let go.'} Your plan
          and your answers are still there.
        </chakra.p>
        {order.planId ? <LinkButton to={`/plans/${order.planId}`}>Back to your plan</LinkButton> : null}
      </Section>
    );
  }
  return null;
}

function ChooseAgain({ order, act }: { order: OrderView; act: Act }) {
  const { data } = useQuery(rebookQuery(order.reference));
  const [workshopId, setWorkshop] = useState<string | null>(null);
  const [slotStart, setSlot] = useState<string | null>(null);
  const workshop = data?.workshops.find(({ id }) => id === workshopId);
  return (
    <Section>
      <Title>Choose again</Title>
      {order.booking?.declineReason ? (
        <chakra.p marginBottom="3">
          {order.booking.workshopName} wrote: “{order.booking.declineReason}”
        </chakra.p>
      ) : null}
      {data ? (
        <>
          <ChoiceGroup
            id="again"
            name="again"
            legend="Another workshop, at no more than you paid"
            hint={data.workshops.length === 0 ? 'None has a free date at that price.' : undefined}
            choices={data.workshops.map(({ id, name, town }) => ({ value: id, label: `${name}, ${town}` }))}
            value={workshopId}
            onChange={(id) => {
              setWorkshop(id);
              setSlot(null);
            }}
          />
          {workshop ? (
            <SlotPicker
              id="again-slot"
              slots={workshop.slots}
              zone={workshop.timeZone}
              value={slotStart}
              onPick={setSlot}
            />
          ) : null}
          <chakra.div display="flex" flexWrap="wrap" gap="3">
            {workshop && slotStart ? (
              <Button
                busy={act.isPending && 'Asking'}
                onClick={() => act.mutate({ path: 'workshop', body: { workshopId: workshop.id, slotStart } })}
              >
                Ask {workshop.name}
              </Button>
            ) : null}
            {data.selfFit.allowed ? (
              <Button tone="plain" onClick={() => act.mutate({ path: 'self-fit' })}>
                Fit it myself, the work refunded
              </Button>
            ) : (
              <p>{data.selfFit.reason}</p>
            )}
          </chakra.div>
        </>
      ) : (
        <Skeleton what="Looking for free dates" />
      )}
    </Section>
  );
}

function Booking({ order }: { order: OrderView }) {
  const { booking } = order;
  if (!booking || order.state === 'released') return null;
  return (
    <Section>
      <Title>Fitting</Title>
      <p>
        <strong>{formatDateTime(booking.start, booking.timeZone)}</strong>, {booking.workshopName}
      </p>
      <chakra.p color="slate">
        {booking.address.join(', ')}. {booking.phone}
      </chakra.p>
      {booking.state === 'requested' && booking.answerBy ? (
        <p>It answers by {formatDateTime(booking.answerBy, booking.timeZone)}.</p>
      ) : null}
    </Section>
  );
}

function WhatWasSet({ order }: { order: OrderView }) {
  if (!order.fitting?.fittedAt) return null;
  const { record, mechanic } = order.fitting;
  return (
    <Section>
      <Title>What was set</Title>
      <SpecTable
        caption={`Recorded by ${mechanic}`}
        rows={[
          { label: 'Serial number', value: record.serialNumber },
          record.spring.kind === 'air'
            ? { label: 'Air pressure', value: record.spring.gaugePsi, unit: 'psi' }
            : { label: 'Spring', value: record.spring.rateLbPerIn, unit: 'lb/in' },
          { label: 'Sag at the shock', value: record.sagMm, unit: 'mm' },
          ...record.torques.map(({ bolt, setNm }) => ({ label: bolt, value: setNm, unit: 'N m' })),
        ]}
      />
    </Section>
  );
}

function Refund({ act }: { act: Act }) {
  const [sure, setSure] = useState(false);
  return (
    <Section>
      <Title>Changed your mind?</Title>
      <chakra.p marginBottom="3">Nothing has been sent yet, so you can have all your money back.</chakra.p>
      {sure ? (
        <chakra.div display="flex" flexWrap="wrap" gap="3">
          <Button
            tone="danger"
            busy={act.isPending && 'Refunding'}
            onClick={() => act.mutate({ path: 'refund' })}
          >
            Yes, cancel the order and refund it
          </Button>
          <Button tone="plain" onClick={() => setSure(false)}>
            Keep the order
          </Button>
        </chakra.div>
      ) : (
        <Button tone="plain" onClick={() => setSure(true)}>
          Cancel and refund
        </Button>
      )}
    </Section>
  );
}
