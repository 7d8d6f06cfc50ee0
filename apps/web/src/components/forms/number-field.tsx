import { chakra } from '@chakra-ui/react';
import { Field, type FieldProps } from './field';
import { parseNumber } from './parse-number';
import { UnitSwitch } from './unit-switch';

const Frame = chakra('div', {
  base: {
    display: 'flex',
    alignItems: 'stretch',
    minHeight: '3.5rem',
    bg: 'paper',
    borderWidth: '2px',
    borderColor: 'ink',
    borderRadius: 'control',
    '&:focus-within': { outline: '3px solid', outlineColor: 'tarn', outlineOffset: '2px' },
    '&[data-invalid]': { borderColor: 'brick' },
  },
});

const Input = chakra('input', {
  base: {
    flex: '1',
    minWidth: '0',
    bg: 'transparent',
    paddingInline: '4',
    fontSize: 'xl',
    fontWeight: 'heavy',
    fontVariantNumeric: 'tabular-nums',
    _focusVisible: { outline: 'none' },
  },
});

export interface NumberReport<U extends string> {
  /** Exactly what was typed: shown again as it is, never corrected under the reader's hands. */
  raw: string;
  unit: U;
  /** The number in `unit`, or null while it cannot be read. */
  value: number | null;
}

export interface NumberFieldProps<U extends string> extends Omit<FieldProps, 'children'> {
  name?: string;
  raw: string;
  unit: U;
  /** One unit shows as a word, several as a switch. Changing it keeps the typed figure: it was read in that unit. */
  units: readonly U[];
  onChange: (report: NumberReport<U>) => void;
  onBlur?: () => void;
}

/** A big figure with its unit, for measurements taken with dirty fingers. */
export function NumberField<U extends string>(props: NumberFieldProps<U>) {
  const { name, raw, unit, units, onChange, onBlur, ...field } = props;
  const report = (change: Partial<{ raw: string; unit: U }>) => {
    const next = { raw, unit, ...change };
    onChange({ ...next, value: parseNumber(next.raw) });
  };
  return (
    <Field {...field}>
      {(control) => (
        <Frame data-invalid={field.error ? '' : undefined}>
          <Input
            {...control}
            name={name}
            inputMode="decimal"
            autoComplete="off"
            enterKeyHint="next"
            value={raw}
            onChange={(event) => report({ raw: event.target.value })}
            onBlur={onBlur}
          />
          <UnitSwitch id={field.id} units={units} unit={unit} onChange={(next) => report({ unit: next })} />
        </Frame>
      )}
    </Field>
  );
}
