import { standardSchemaResolver } from '@hookform/resolvers/standard-schema';
import { chakra } from '@chakra-ui/react';
import { useState, type ComponentProps } from 'react';
import { useForm } from 'react-hook-form';
import type { z } from 'zod';
import { applyProblem } from '../../lib/apply-problem';
import { Button } from '../button';
import { ErrorSummary } from './error-summary';
import { Field } from './field';
import { TextInput } from './text-input';

type Values = Record<string, string>;

export interface SimpleField {
  name: string;
  label: string;
  hint?: string;
  input: ComponentProps<'input'>;
}

interface SimpleFormProps<S extends z.ZodType<unknown, Values>> {
  schema: S;
  fields: readonly SimpleField[];
  button: string;
  busy: string;
  /** @throws ApiProblem, shown at the first field unless it names one */
  send: (values: z.output<S>) => Promise<void>;
  /** Whether the form was last sent with faults: for the page's title. */
  onFaults?: (faulty: boolean) => void;
  describe?: (error: unknown) => string | undefined;
}

/** A few lines of text and a button; faults on top and at their fields, nothing typed is lost. */
export function SimpleForm<S extends z.ZodType<unknown, Values>>(props: SimpleFormProps<S>) {
  const { schema, fields, button, busy, send, onFaults, describe } = props;
  const [attempt, setAttempt] = useState(0);
  const { register, handleSubmit, formState, setError } = useForm<Values, unknown, Values>({
    resolver: standardSchemaResolver(schema) as never,
    shouldFocusError: false,
    defaultValues: Object.fromEntries(fields.map(({ name }) => [name, ''])),
  });
  const failed = () => {
    setAttempt((count) => count + 1);
    onFaults?.(true);
  };
  const submit = async (values: Values) => {
    try {
      await send(values as z.output<S>);
      onFaults?.(false);
    } catch (error) {
      const names = fields.map(({ name }) => name);
      applyProblem(error, setError, { fields: names, otherwise: names[0] ?? 'root', describe });
      failed();
    }
  };
  const faults = fields.flatMap(({ name }) => {
    const message = formState.errors[name]?.message;
    return message ? [{ fieldId: name, message }] : [];
  });
  return (
    <chakra.form noValidate maxWidth="form" onSubmit={(event) => void handleSubmit(submit, failed)(event)}>
      <ErrorSummary faults={faults} attempt={attempt} />
      {fields.map(({ name, label, hint, input }) => (
        <Field key={name} id={name} label={label} hint={hint} error={formState.errors[name]?.message}>
          {(control) => <TextInput {...input} {...control} {...register(name)} />}
        </Field>
      ))}
      <Button type="submit" size="large" busy={formState.isSubmitting && busy}>
        {button}
      </Button>
    </chakra.form>
  );
}
