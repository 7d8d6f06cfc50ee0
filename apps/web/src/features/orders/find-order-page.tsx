import { findOrderBody, type FindOrderBody } from '@linkfell/contracts';
import { standardSchemaResolver } from '@hookform/resolvers/standard-schema';
import { chakra } from '@chakra-ui/react';
import { useMutation } from '@tanstack/react-query';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { useNavigate } from 'react-router-dom';
import { Button } from '../../components/button';
import { ErrorSummary } from '../../components/forms/error-summary';
import { Field } from '../../components/forms/field';
import { TextInput } from '../../components/forms/text-input';
import { Page } from '../../components/page';
import { PageHeading } from '../../components/page-heading';
import { isApiProblem } from '../../lib/api-problem';
import { usePageTitle } from '../../lib/page-title';
import { findOrder } from './api';

/** An order without an account: its reference and the e-mail address it was placed with. */
export function FindOrderPage() {
  const navigate = useNavigate();
  const [attempt, setAttempt] = useState(0);
  const { register, handleSubmit, formState, setError } = useForm<FindOrderBody>({
    resolver: standardSchemaResolver(findOrderBody),
    shouldFocusError: false,
    defaultValues: { reference: '', email: '' },
  });
  const find = useMutation({
    mutationFn: findOrder,
    onSuccess: (_, { reference }) => void navigate(`/orders/${reference.trim().toUpperCase()}`),
    onError: (error) => {
      const message =
        isApiProblem(error) && error.status === 404
          ? 'We know no order with this reference and e-mail address together'
          : isApiProblem(error)
            ? (error.detail ?? error.title)
            : 'That did not work; try again';
      setError('reference', { message });
      setAttempt((count) => count + 1);
    },
  });
  const faults = (['reference', 'email'] as const).flatMap((fieldId) => {
    const message = formState.errors[fieldId]?.message;
    return message ? [{ fieldId, message }] : [];
  });
  usePageTitle('Find my order', { error: faults.length > 0 });
  return (
    <Page width="form">
      <ErrorSummary faults={faults} attempt={attempt} />
      <PageHeading lead="Both stand in the confirmation we sent you.">Find my order</PageHeading>
      <chakra.form
        noValidate
        onSubmit={(event) =>
          void handleSubmit(
            (body) => find.mutate(body),
            () => setAttempt((count) => count + 1),
          )(event)
        }
      >
        <Field
          id="reference"
          label="Reference"
          hint="Such as LF-7KPQX3DT"
          error={formState.errors.reference?.message}
        >
          {(control) => (
            <TextInput
              {...control}
              autoComplete="off"
              autoCapitalize="characters"
              {...register('reference')}
            />
          )}
        </Field>
        <Field id="email" label="E-mail" error={formState.errors.email?.message}>
          {(control) => <TextInput {...control} type="email" autoComplete="email" {...register('email')} />}
        </Field>
        <Button type="submit" size="large" busy={find.isPending && 'Looking'}>
          Find it
        </Button>
      </chakra.form>
    </Page>
  );
}
