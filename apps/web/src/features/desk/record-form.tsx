import { fittingRecordBody, type FittingRecordBody, type JobSheetView } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { useState } from 'react';
import { Button } from '../../components/button';
import { Checkbox } from '../../components/forms/checkbox';
import { ErrorSummary } from '../../components/forms/error-summary';
import { Field } from '../../components/forms/field';
import { NumberField } from '../../components/forms/number-field';
import { parseNumber } from '../../components/forms/parse-number';
import { TextArea, TextInput } from '../../components/forms/text-input';
import type { useJob } from './api';

type Raw = Record<string, string>;

function startOf(sheet: JobSheetView): Raw {
  const record = sheet.record?.record;
  const torque = (index: number): Raw => ({
    [`torque${index}`]: record?.torques[index] ? String(record.torques[index].setNm) : '',
  });
  return {
    serial: record?.serialNumber ?? '',
    pressure:
      record?.spring.kind === 'air' ? String(record.spring.gaugePsi) : String(sheet.spring.gaugePsi ?? ''),
    rate:
      record?.spring.kind === 'coil'
        ? String(record.spring.rateLbPerIn)
        : String(sheet.spring.rateLbPerIn ?? ''),
    turns: record?.spring.kind === 'coil' ? String(record.spring.preloadTurns) : '1',
    sag: record ? String(record.sagMm) : '',
    travel: record?.travelChecked ? 'yes' : '',
    notices: record?.noticesChecked ? 'yes' : '',
    notes: record?.notes ?? '',
    ...torque(0),
    ...torque(1),
  };
}

const boltName = (end: 'frame' | 'link'): string => (end === 'frame' ? 'Frame end bolt' : 'Link end bolt');
const fieldIds: Record<string, string> = {
  serialNumber: 'serial',
  gaugePsi: 'pressure',
  rateLbPerIn: 'rate',
  preloadTurns: 'turns',
  sagMm: 'sag',
  notes: 'notes',
};

/** What is recorded on the day: serial number, spring or pressure, sag, torques as set. */
export function RecordForm({ sheet, job }: { sheet: JobSheetView; job: ReturnType<typeof useJob> }) {
  const [raw, setRaw] = useState(() => startOf(sheet));
  const [faults, setFaults] = useState<{ fieldId: string; message: string }[]>([]);
  const [attempt, setAttempt] = useState(0);
  const set = (name: string) => (value: string) => setRaw((before) => ({ ...before, [name]: value }));
  const fault = (fieldId: string) => faults.find((each) => each.fieldId === fieldId)?.message;
  const number = (name: string): number => parseNumber(raw[name] ?? '') ?? NaN;

  const send = () => {
    const record = {
      serialNumber: raw.serial,
      spring:
        sheet.spring.kind === 'air'
          ? { kind: 'air', gaugePsi: number('pressure') }
          : { kind: 'coil', rateLbPerIn: number('rate'), preloadTurns: number('turns') },
      sagMm: number('sag'),
      torques: sheet.ends.map(({ end, torqueNm }, index) => ({
        bolt: boltName(end),
        printedNm: torqueNm,
        setNm: number(`torque${index}`),
      })),
      travelChecked: raw.travel === 'yes',
      noticesChecked: raw.notices === 'yes',
      notes: raw.notes,
    };
    const parsed = fittingRecordBody.safeParse(record);
    if (parsed.success) {
      setFaults([]);
      job.mutate({ path: 'record', version: sheet.version, record: parsed.data satisfies FittingRecordBody });
      return;
    }
    const found = parsed.error.issues.map(({ path, message }) => ({
      fieldId:
        path[0] === 'torques' ? `torque${String(path[1])}` : (fieldIds[String(path.at(-1))] ?? 'serial'),
      message: /^Invalid|^Too/.test(message) ? 'Enter a figure that is possible here' : message,
    }));
    setFaults(found);
    setAttempt((count) => count + 1);
  };
  const figure = (id: string, label: string, unit: string, hint?: string) => (
    <NumberField
      key={id}
      id={id}
      label={label}
      hint={hint}
      error={fault(id)}
      raw={raw[id] ?? ''}
      unit={unit}
      units={[unit]}
      onChange={(report) => set(id)(report.raw)}
    />
  );
  return (
    <chakra.section marginBottom="8" maxWidth="form" borderTopWidth="2px" borderColor="ink" paddingTop="5">
      <chakra.h2 fontSize="xl" fontWeight="heavy" marginBottom="4">
        Record of the fitting
      </chakra.h2>
      <ErrorSummary faults={faults} attempt={attempt} />
      <form
        noValidate
        onSubmit={(event) => {
          event.preventDefault();
          send();
        }}
      >
        <Field id="serial" label="Serial number of the new shock" error={fault('serial')}>
          {(control) => (
            <TextInput
              {...control}
              autoComplete="off"
              value={raw.serial ?? ''}
              onChange={(event) => set('serial')(event.target.value)}
            />
          )}
        </Field>
        {sheet.spring.kind === 'air'
          ? figure('pressure', 'Pressure as set', 'psi')
          : [figure('rate', 'Spring fitted', 'lb/in'), figure('turns', 'Preload', 'turns')]}
        {figure('sag', 'Sag as set, at the shock', 'mm', `The sheet says ${sheet.spring.sag}`)}
        {sheet.ends.map(({ end, torqueNm }, index) =>
          figure(
            `torque${index}`,
            `${boltName(end)}, as set`,
            'N m',
            torqueNm === null
              ? 'As printed on the bolt, the frame or in the manual'
              : `Printed: ${torqueNm} N m`,
          ),
        )}
        <Checkbox
          id="travel"
          label="With air or spring out, moved through its whole travel: no contact"
          checked={raw.travel === 'yes'}
          onChange={(event) => set('travel')(event.target.checked ? 'yes' : '')}
        />
        <Checkbox
          id="notices"
          label="Checked for recalls on frame and shock"
          checked={raw.notices === 'yes'}
          onChange={(event) => set('notices')(event.target.checked ? 'yes' : '')}
        />
        <Field id="notes" label="Notes for the rider" optional error={fault('notes')}>
          {(control) => (
            <TextArea
              as="textarea"
              {...control}
              value={raw.notes ?? ''}
              onChange={(event) => set('notes')(event.currentTarget.value)}
            />
          )}
        </Field>
        <Button type="submit" busy={job.isPending && 'Saving'}>
          Save the record
        </Button>
      </form>
    </chakra.section>
  );
}
