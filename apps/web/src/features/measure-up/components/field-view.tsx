import { chakra } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { Checkbox } from '../../../components/forms/checkbox';
import { ChoiceGroup } from '../../../components/forms/choice-group';
import { Field } from '../../../components/forms/field';
import { NumberField } from '../../../components/forms/number-field';
import { Select } from '../../../components/forms/select';
import { TextInput } from '../../../components/forms/text-input';
import { townsQuery } from '../api/measure-up';
import type { FieldSpec, Raw } from '../specs/spec';

export interface FieldViewProps {
  field: FieldSpec;
  raw: Raw;
  error?: string;
  onChange: (change: Raw) => void;
}

/** One field of a question, by its description. */
export function FieldView({ field, raw, error, onChange }: FieldViewProps) {
  const { name, label, hint } = field;
  const common = { id: name, label, hint, error };
  switch (field.type) {
    case 'number':
      return (
        <NumberField
          {...common}
          name={name}
          optional={field.optional}
          raw={raw[name] ?? ''}
          unit={raw[`${name}-unit`] ?? field.units[0] ?? 'mm'}
          units={field.units}
          onChange={(report) => onChange({ [name]: report.raw, [`${name}-unit`]: report.unit })}
        />
      );
    case 'choice':
      return (
        <ChoiceGroup
          id={name}
          name={name}
          legend={label}
          hint={hint}
          error={error}
          layout={field.layout}
          choices={field.choices}
          value={raw[name] ?? null}
          onChange={(value) => onChange({ [name]: value })}
        />
      );
    case 'check':
      return (
        <Checkbox
          {...common}
          checked={raw[name] === 'yes'}
          onChange={(event) => onChange({ [name]: event.target.checked ? 'yes' : '' })}
        />
      );
    case 'text':
      return (
        <Field {...common} optional={field.optional}>
          {(control) => (
            <TextInput
              {...control}
              name={name}
              autoComplete="off"
              value={raw[name] ?? ''}
              onChange={(event) => onChange({ [name]: event.target.value })}
            />
          )}
        </Field>
      );
    case 'select':
      return (
        <SelectField
          {...common}
          value={raw[name] ?? ''}
          options={field.options}
          onPick={(value) => onChange({ [name]: value })}
        />
      );
    case 'town':
      return (
        <TownField {...common} value={raw[name] ?? ''} onPick={(value) => onChange({ [name]: value })} />
      );
  }
}

interface SelectFieldProps {
  id: string;
  label: string;
  hint?: string;
  error?: string;
  value: string;
  options: readonly { value: string; label: string }[];
  onPick: (value: string) => void;
}

function SelectField({ value, options, onPick, ...field }: SelectFieldProps) {
  return (
    <Field {...field}>
      {(control) => (
        <Select {...control} value={value} onChange={(event) => onPick(event.target.value)}>
          <option value="">Choose</option>
          {options.map((option) => (
            <chakra.option key={option.value} value={option.value}>
              {option.label}
            </chakra.option>
          ))}
        </Select>
      )}
    </Field>
  );
}

function TownField(props: Omit<SelectFieldProps, 'options'>) {
  const { data } = useQuery(townsQuery);
  return (
    <SelectField
      {...props}
      options={(data?.towns ?? []).map(({ id, name }) => ({ value: id, label: name }))}
    />
  );
}
