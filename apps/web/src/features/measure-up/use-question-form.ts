import { questionSchemas, type QuestionKey } from '@linkfell/contracts';
import { useState } from 'react';
import { useForm, useWatch, type Resolver } from 'react-hook-form';
import type { FieldFault } from '../../components/forms/error-summary';
import type { FieldSpec, Raw } from './specs/spec';

interface Issue {
  path: PropertyKey[];
  message: string;
}

/** Which field of the form a fault in the answer belongs to: by its name, else by what the path speaks of. */
function fieldOf(path: readonly PropertyKey[], fields: readonly FieldSpec[]): string {
  const names = fields.map(({ name }) => name);
  const said = path.map(String);
  const direct = [...said].reverse().find((part) => names.includes(part));
  if (direct) return direct;
  const last = said.at(-1)?.replace(/(Mm|Kg|Minor|Id|Key)$/, '') ?? '';
  const ends: Record<string, string> = { frameEnd: 'frame-', linkEnd: 'link-' };
  const prefix = ends[said[0] ?? ''] ?? '';
  const near = names.find((name) => name === `${prefix}${last}` || name.startsWith(prefix + last));
  return near ?? fields.find(({ type }) => type === 'number')?.name ?? names[0] ?? 'question';
}

/**
 * A question's form: text as typed, checked against the contract's own schema when it is sent.
 * @param toValue makes the answer of what was typed
 */
export function useQuestionForm(
  key: QuestionKey,
  start: Raw,
  fieldsOf: (raw: Raw) => readonly FieldSpec[],
  toValue: (raw: Raw) => unknown,
) {
  const [attempt, setAttempt] = useState(0);
  const resolver: Resolver<Raw> = (raw) => {
    const parsed = questionSchemas[key].safeParse(toValue(raw));
    if (parsed.success) return { values: raw, errors: {} };
    const fields = fieldsOf(raw);
    const errors: Record<string, { type: string; message: string }> = {};
    for (const { path, message } of parsed.error.issues as Issue[]) {
      const name = fieldOf(path, fields);
      errors[name] ??= {
        type: 'contract',
        message: plain(
          message,
          fields.find((field) => field.name === name),
          raw[name],
        ),
      };
    }
    return { values: {}, errors };
  };
  const form = useForm<Raw>({
    defaultValues: start,
    values: start,
    resolver,
    shouldFocusError: false,
    resetOptions: { keepDirtyValues: true },
  });
  const raw = useWatch({ control: form.control }) as Raw;
  const faults: FieldFault[] = Object.entries(form.formState.errors).flatMap(([fieldId, error]) =>
    error?.message ? [{ fieldId, message: String(error.message) }] : [],
  );
  return {
    raw,
    faults,
    attempt,
    change: (change: Raw) => {
      for (const [name, value] of Object.entries(change)) form.setValue(name, value, { shouldDirty: true });
    },
    fault: (name: string) => faults.find(({ fieldId }) => fieldId === name)?.message,
    setFault: (name: string, message: string) => {
      form.setError(name, { type: 'server', message });
      setAttempt((count) => count + 1);
    },
    submit: (send: (value: unknown) => void) =>
      form.handleSubmit(
        (values) => send(toValue(values)),
        () => setAttempt((count) => count + 1),
      ),
  };
}

/** A schema's own words may say nothing to a rider: what was not chosen or cannot be read is said as such. */
function plain(message: string, field: FieldSpec | undefined, typed = ''): string {
  if (field?.type === 'choice') return `Choose one: ${field.label.toLowerCase()}`;
  if (field?.type === 'select' || field?.type === 'town') return 'Choose one from the list';
  if (field?.name === 'frameId') return 'Choose your frame from the list, or say that it is not listed';
  if (message === 'Enter a figure' || /^Invalid|^Expected|discriminator/i.test(message)) {
    if (field?.name === 'text') return 'A size looks like 210x55 or 7.875 x 2.25';
    if (typed.trim()) return `“${typed.trim()}” cannot be read as a figure`;
    return `Enter a figure: ${field ? field.label.toLowerCase() : 'this one'}`;
  }
  return message;
}
