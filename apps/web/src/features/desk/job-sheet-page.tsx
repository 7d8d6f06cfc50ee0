import { declineBody, type JobSheetView } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useParams } from 'react-router-dom';
import { Button } from '../../components/button';
import { Cautions } from '../../components/cautions';
import { Field } from '../../components/forms/field';
import { TextArea } from '../../components/forms/text-input';
import { Notice } from '../../components/notice';
import { SpecTable } from '../../components/spec-table';
import { isApiProblem } from '../../lib/api-problem';
import { formatDateTime } from '../../lib/format-date';
import { jobSheetQuery, useJob } from './api';
import { DeskFrame } from './desk-frame';
import { RecordForm } from './record-form';

const Section = chakra('section', { base: { marginBottom: '8', maxWidth: '46rem' } });
const states: Record<JobSheetView['booking']['state'], string> = {
  requested: 'Waits for your answer',
  accepted: 'Agreed',
  declined: 'Declined',
  lapsed: 'Not answered in time',
  cancelled: 'Cancelled',
  fitted: 'Fitted',
};

/** The job sheet: answer, work, record. */
export function JobSheetPage() {
  const { orgId = '', bookingId = '' } = useParams();
  const { data: sheet, error } = useQuery(jobSheetQuery(orgId, bookingId));
  return (
    <DeskFrame title="Job sheet" error={error} ready={sheet !== undefined}>
      {sheet ? <Sheet key={bookingId} sheet={sheet} orgId={orgId} /> : null}
    </DeskFrame>
  );
}

function Sheet({ sheet, orgId }: { sheet: JobSheetView; orgId: string }) {
  const { booking } = sheet;
  const job = useJob(orgId, booking.id);
  return (
    <>
      <chakra.p fontSize="lg" marginBottom="6">
        <strong>{states[booking.state]}</strong>: {formatDateTime(booking.start, booking.timeZone)},{' '}
        {booking.stand}, {booking.orderReference}
      </chakra.p>
      {job.error ? (
        <chakra.div marginBottom="6">
          <Notice
            tone="brick"
            announce="alert"
            title={isApiProblem(job.error) ? job.error.title : 'That did not work'}
          >
            <p>
              {isApiProblem(job.error)
                ? (job.error.detail ?? 'Look at the sheet again.')
                : 'Try again in a moment.'}
            </p>
          </Notice>
        </chakra.div>
      ) : null}
      {booking.state === 'requested' ? <Answer sheet={sheet} job={job} /> : null}
      <Section>
        <SpecTable
          caption="The job"
          rows={[
            { label: 'Bike', value: booking.bike },
            { label: 'Frame sheet', value: sheet.frameSheet },
            { label: 'Entry', value: sheet.entry },
            { label: 'Old shock', value: sheet.oldShock },
            { label: 'New shock', value: sheet.newShock },
            { label: 'Way round', value: sheet.wayRound },
            ...sheet.ends.map(({ end, what, thread, torqueNm }) => ({
              label: end === 'frame' ? 'Frame end' : 'Link end',
              value: `${what}${thread ? `, thread ${thread}` : ''}, torque ${torqueNm === null ? 'as printed: ______' : `${torqueNm} N m as printed`}`,
            })),
            { label: sheet.spring.kind === 'air' ? 'Air' : 'Spring', value: sheet.spring.say },
            { label: 'Sag', value: sheet.spring.sag },
            { label: 'Rider', value: `${sheet.rider.name}, ${sheet.rider.phone}, ${sheet.rider.weight}` },
          ]}
        />
      </Section>
      <Section>
        <SpecTable
          caption="The work"
          rows={sheet.work.map(({ say, minutes }) => ({ label: say, value: minutes, unit: 'min' }))}
        />
      </Section>
      <Section>
        <SpecTable
          caption="Parts"
          rows={sheet.parts.map(({ name, from, parcel }) => ({ label: name, value: `${from}: ${parcel}` }))}
        />
        <chakra.p marginTop="3">Tools: {sheet.tools.join(', ')}.</chakra.p>
      </Section>
      <Section>
        <Cautions lines={sheet.cautions} />
      </Section>
      {booking.state === 'accepted' ? (
        <>
          <RecordForm key={sheet.version} sheet={sheet} job={job} />
          <Section>
            <chakra.h2 fontSize="xl" fontWeight="heavy" marginBottom="3">
              Done?
            </chakra.h2>
            {sheet.missing.length > 0 ? (
              <Notice tone="heather" title="Before it can be marked fitted">
                <chakra.ul paddingLeft="5" listStyleType="disc">
                  {sheet.missing.map((line) => (
                    <li key={line}>{line}</li>
                  ))}
                </chakra.ul>
              </Notice>
            ) : (
              <Button
                size="large"
                busy={job.isPending && 'Saving'}
                onClick={() => job.mutate({ path: 'fitted' })}
              >
                Mark fitted
              </Button>
            )}
          </Section>
        </>
      ) : null}
      {booking.state === 'fitted' && sheet.record ? (
        <Section>
          <SpecTable
            caption={`Fitted, recorded by ${sheet.record.mechanic}`}
            rows={[
              { label: 'Serial number', value: sheet.record.record.serialNumber },
              ...sheet.record.record.torques.map(({ bolt, setNm }) => ({
                label: bolt,
                value: setNm,
                unit: 'N m',
              })),
            ]}
          />
        </Section>
      ) : null}
    </>
  );
}

function Answer({ sheet, job }: { sheet: JobSheetView; job: ReturnType<typeof useJob> }) {
  const [declining, setDeclining] = useState(false);
  const [reason, setReason] = useState('');
  const [fault, setFault] = useState<string>();
  const { answerBy, timeZone } = sheet.booking;
  const decline = () => {
    const parsed = declineBody.safeParse({ reason });
    setFault(parsed.success ? undefined : parsed.error.issues[0]?.message);
    if (parsed.success) job.mutate({ path: 'decline', reason: parsed.data.reason });
  };
  return (
    <Section>
      <chakra.p marginBottom="3">
        Parts are sent to you only when you accept
        {answerBy ? `; please answer by ${formatDateTime(answerBy, timeZone)}` : ''}.
      </chakra.p>
      {declining ? (
        <>
          <Field id="reason" label="Reason, which the rider will read" error={fault}>
            {(control) => (
              <TextArea
                as="textarea"
                {...control}
                value={reason}
                onChange={(event) => setReason(event.currentTarget.value)}
              />
            )}
          </Field>
          <chakra.div display="flex" flexWrap="wrap" gap="3">
            <Button tone="danger" busy={job.isPending && 'Declining'} onClick={decline}>
              Decline
            </Button>
            <Button tone="plain" onClick={() => setDeclining(false)}>
              Back
            </Button>
          </chakra.div>
        </>
      ) : (
        <chakra.div display="flex" flexWrap="wrap" gap="3">
          <Button
            size="large"
            busy={job.isPending && 'Accepting'}
            onClick={() => job.mutate({ path: 'accept' })}
          >
            Accept the fitting
          </Button>
          <Button tone="plain" size="large" onClick={() => setDeclining(true)}>
            Decline
          </Button>
        </chakra.div>
      )}
    </Section>
  );
}
