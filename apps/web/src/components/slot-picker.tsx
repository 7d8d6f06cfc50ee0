import { chakra } from '@chakra-ui/react';
import { useState } from 'react';
import { formatDay, formatTime } from '../lib/format-date';
import { ChoiceGroup } from './forms/choice-group';
import { Field } from './forms/field';
import { Select } from './forms/select';

interface Slot {
  start: string;
  end: string;
}

const dayOf = (instant: string, zone: string): string =>
  new Intl.DateTimeFormat('en-CA', {
    timeZone: zone,
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
  }).format(new Date(instant));

interface SlotPickerProps {
  id: string;
  slots: readonly Slot[];
  zone: string;
  value: string | null;
  onPick: (start: string) => void;
  error?: string;
}

/** A day, then a time on it, in the workshop's own zone, earliest first. */
export function SlotPicker({ id, slots, zone, value, onPick, error }: SlotPickerProps) {
  const days = [...new Set(slots.map(({ start }) => dayOf(start, zone)))];
  const chosen = value ? dayOf(value, zone) : null;
  const [looked, setLooked] = useState<string | null>(null);
  const day = looked && days.includes(looked) ? looked : chosen && days.includes(chosen) ? chosen : days[0];
  if (!day) return <p>No free date in the next weeks.</p>;
  return (
    <chakra.div>
      <Field id={`${id}-day`} label="Day of the fitting" hint="The parts have arrived by then">
        {(control) => (
          <Select {...control} value={day} onChange={(event) => setLooked(event.target.value)}>
            {days.map((each) => (
              <option key={each} value={each}>
                {formatDay(each)}
              </option>
            ))}
          </Select>
        )}
      </Field>
      <ChoiceGroup
        id={id}
        name={id}
        legend="Start"
        error={error}
        layout="row"
        choices={slots
          .filter(({ start }) => dayOf(start, zone) === day)
          .map(({ start }) => ({ value: start, label: formatTime(start, zone) }))}
        value={value}
        onChange={onPick}
      />
    </chakra.div>
  );
}
