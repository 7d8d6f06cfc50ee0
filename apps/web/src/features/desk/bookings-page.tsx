import type { BookingList } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { TextLink } from '../../components/text-link';
import { formatDateTime, formatTime } from '../../lib/format-date';
import { bookingsQuery } from './api';
import { DeskFrame } from './desk-frame';

type Booking = BookingList['bookings'][number];

const groups: readonly { title: string; states: readonly Booking['state'][] }[] = [
  { title: 'Waiting for your answer', states: ['requested'] },
  { title: 'Agreed', states: ['accepted'] },
  { title: 'Fitted', states: ['fitted'] },
  { title: 'Not taken', states: ['declined', 'lapsed', 'cancelled'] },
];

/** A workshop's fittings: what to answer first. */
export function BookingsPage() {
  const { orgId = '' } = useParams();
  const { data, error } = useQuery(bookingsQuery(orgId));
  return (
    <DeskFrame title="Fittings" error={error} ready={data !== undefined}>
      {data?.bookings.length === 0 ? (
        <p>No fittings yet. We write to you when a rider asks for one.</p>
      ) : null}
      {groups.map(({ title, states }) => {
        const bookings = (data?.bookings ?? []).filter(({ state }) => states.includes(state));
        if (bookings.length === 0) return null;
        return (
          <chakra.section key={title} marginBottom="8">
            <chakra.h2 fontSize="xl" fontWeight="heavy" marginBottom="2">
              {title}
            </chakra.h2>
            <chakra.ul listStyleType="none" borderTopWidth="2px" borderColor="ink">
              {bookings.map((booking) => (
                <chakra.li key={booking.id} paddingBlock="3" borderBottomWidth="1px" borderColor="hair">
                  <TextLink
                    to={`/desk/${orgId}/bookings/${booking.id}`}
                    display="inline-flex"
                    alignItems="center"
                    minHeight="target"
                    fontWeight="bold"
                  >
                    {formatDateTime(booking.start, booking.timeZone)} to{' '}
                    {formatTime(booking.end, booking.timeZone)}
                  </TextLink>
                  <p>
                    {booking.shock} into {booking.bike}, for {booking.riderName}. {booking.stand}.
                  </p>
                  <chakra.p color="slate">
                    {booking.orderReference}
                    {booking.state === 'requested' && booking.answerBy
                      ? `. Answer by ${formatDateTime(booking.answerBy, booking.timeZone)}`
                      : ''}
                  </chakra.p>
                </chakra.li>
              ))}
            </chakra.ul>
          </chakra.section>
        );
      })}
    </DeskFrame>
  );
}
