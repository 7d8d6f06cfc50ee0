import { sentBody, type ParcelRow } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useParams } from 'react-router-dom';
import { Button } from '../../components/button';
import { Field } from '../../components/forms/field';
import { TextInput } from '../../components/forms/text-input';
import { isApiProblem } from '../../lib/api-problem';
import { markSent, parcelsQuery } from './api';
import { DeskFrame } from './desk-frame';

const titles: Record<ParcelRow['state'], string> = {
  'to-send': 'To send',
  waiting: 'Waiting for a workshop',
  sent: 'Sent',
  cancelled: 'Cancelled',
};

/** What a shop has to send, what waits, what is gone. */
export function ParcelsPage() {
  const { orgId = '' } = useParams();
  const { data, error } = useQuery(parcelsQuery(orgId));
  return (
    <DeskFrame title="Parcels" error={error} ready={data !== undefined}>
      {data?.parcels.length === 0 ? <p>No orders yet. We write to you when one comes in.</p> : null}
      {(Object.keys(titles) as ParcelRow['state'][]).map((state) => {
        const parcels = (data?.parcels ?? []).filter((parcel) => parcel.state === state);
        if (parcels.length === 0) return null;
        return (
          <chakra.section key={state} marginBottom="8">
            <chakra.h2 fontSize="xl" fontWeight="heavy" marginBottom="2">
              {titles[state]}
            </chakra.h2>
            {parcels.map((parcel) => (
              <Parcel key={parcel.id} orgId={orgId} parcel={parcel} />
            ))}
          </chakra.section>
        );
      })}
    </DeskFrame>
  );
}

function Parcel({ orgId, parcel }: { orgId: string; parcel: ParcelRow }) {
  const queries = useQueryClient();
  const [tracking, setTracking] = useState('');
  const [fault, setFault] = useState<string>();
  const sent = useMutation({
    mutationFn: () => markSent(orgId, parcel.id, tracking),
    onSuccess: () => void queries.invalidateQueries({ queryKey: ['parcels', orgId] }),
    onError: (error) =>
      setFault(isApiProblem(error) ? (error.detail ?? error.title) : 'Not saved; try again.'),
  });
  const send = () => {
    const parsed = sentBody.safeParse({ tracking });
    setFault(parsed.success ? undefined : parsed.error.issues[0]?.message);
    if (parsed.success) sent.mutate();
  };
  return (
    <chakra.article borderTopWidth="2px" borderColor="ink" paddingBlock="4">
      <chakra.h3 fontSize="lg">{parcel.orderReference}</chakra.h3>
      <chakra.ul paddingLeft="5" listStyleType="disc">
        {parcel.items.map((item) => (
          <li key={item.name}>
            {item.quantity} x {item.name}
          </li>
        ))}
      </chakra.ul>
      <p>To {parcel.to.join(', ')}</p>
      <chakra.p color="slate" marginBottom="3">
        {parcel.say} {parcel.tracking ? `Tracking ${parcel.tracking}.` : ''}
      </chakra.p>
      {parcel.state === 'to-send' ? (
        <chakra.div maxWidth="form">
          <Field id={`tracking-${parcel.id}`} label="Tracking number" optional error={fault}>
            {(control) => (
              <TextInput
                {...control}
                autoComplete="off"
                value={tracking}
                onChange={(event) => setTracking(event.target.value)}
              />
            )}
          </Field>
          <Button busy={sent.isPending && 'Saving'} onClick={send}>
            Mark sent
            <chakra.span srOnly>: {parcel.orderReference}</chakra.span>
          </Button>
        </chakra.div>
      ) : null}
    </chakra.article>
  );
}
