import { checkoutBody, type PlanView } from '@linkfell/contracts';
import { standardSchemaResolver } from '@hookform/resolvers/standard-schema';
import { chakra } from '@chakra-ui/react';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState, type ComponentProps } from 'react';
import { useForm } from 'react-hook-form';
import type { z } from 'zod';
import { Button } from '../../components/button';
import { Checkbox } from '../../components/forms/checkbox';
import { ErrorSummary } from '../../components/forms/error-summary';
import { Field } from '../../components/forms/field';
import { TextInput } from '../../components/forms/text-input';
import { Notice } from '../../components/notice';
import { TextLink } from '../../components/text-link';
import { isApiProblem } from '../../lib/api-problem';
import { formatMoneyExact } from '../../lib/format-money';
import { usePageTitle } from '../../lib/page-title';
import { checkout } from './api';

const form = checkoutBody.omit({ totalMinor: true });
type Form = z.input<typeof form>;
type ContactName = keyof Form['contact'];

const inputs: readonly { name: ContactName; label: string; hint?: string; input: ComponentProps<'input'> }[] =
  [
    { name: 'name', label: 'Name', input: { autoComplete: 'name' } },
    {
      name: 'email',
      label: 'E-mail',
      hint: 'For the confirmation, and to find your order again',
      input: { autoComplete: 'email', type: 'email', inputMode: 'email' },
    },
    { name: 'phone', label: 'Telephone', input: { autoComplete: 'tel', type: 'tel', inputMode: 'tel' } },
    { name: 'street', label: 'Street and number', input: { autoComplete: 'street-address' } },
    { name: 'town', label: 'Town', input: { autoComplete: 'address-level2' } },
    { name: 'postcode', label: 'Postcode', input: { autoComplete: 'postal-code' } },
  ];

/** Contact and terms on one page, seven fields; then the payment page. No account is needed. */
export function CheckoutForm({ plan }: { plan: PlanView }) {
  const queries = useQueryClient();
  const [attempt, setAttempt] = useState(0);
  const [key] = useState(() => crypto.randomUUID());
  const { register, handleSubmit, formState, getValues } = useForm<Form>({
    resolver: standardSchemaResolver(form),
    shouldFocusError: false,
    defaultValues: { contact: { name: '', email: '', phone: '', street: '', town: '', postcode: '' } },
  });
  const pay = useMutation({
    mutationFn: () =>
      // A new total is a new request: its key differs, so that an old answer is never given for it.
      checkout(
        plan.id,
        form
          .and(checkoutBody.pick({ totalMinor: true }))
          .parse({ ...getValues(), totalMinor: plan.totalMinor }),
        `${key}-${plan.totalMinor}-${plan.revision}-${pay0.current}`,
      ),
    onSuccess: ({ paymentUrl }) => window.location.assign(paymentUrl),
    onError: () => {
      pay0.current += 1;
      void queries.invalidateQueries({ queryKey: ['plan', plan.id] });
    },
  });
  const [pay0] = useState(() => ({ current: 0 }));
  const { errors } = formState;
  const faults = [
    ...inputs.flatMap(({ name }) => {
      const message = errors.contact?.[name]?.message;
      return message ? [{ fieldId: name, message }] : [];
    }),
    ...(errors.acceptTerms?.message
      ? [{ fieldId: 'acceptTerms', message: 'Tick the box to accept the terms' }]
      : []),
  ];
  usePageTitle(`Plan: ${plan.shock.modelName}`, { error: faults.length > 0 });
  return (
    <chakra.form
      noValidate
      maxWidth="form"
      onSubmit={(event) =>
        void handleSubmit(
          () => pay.mutate(),
          () => setAttempt((count) => count + 1),
        )(event)
      }
    >
      <ErrorSummary faults={faults} attempt={attempt} />
      {inputs.map(({ name, label, hint, input }) => (
        <Field key={name} id={name} label={label} hint={hint} error={errors.contact?.[name]?.message}>
          {(control) => <TextInput {...input} {...control} {...register(`contact.${name}`)} />}
        </Field>
      ))}
      <Checkbox
        id="acceptTerms"
        error={errors.acceptTerms ? 'Tick the box to accept the terms' : undefined}
        label={
          <>
            I accept the <TextLink to="/terms">terms</TextLink> and have read the cautions above
          </>
        }
        {...register('acceptTerms')}
      />
      {pay.error ? (
        <chakra.div marginBottom="4">
          <Notice
            tone="brick"
            announce="alert"
            title={isApiProblem(pay.error) ? pay.error.title : 'That did not work'}
          >
            <p>
              {isApiProblem(pay.error)
                ? (pay.error.detail ?? 'Look at your plan again.')
                : 'Nothing was taken. Try again in a moment.'}
            </p>
          </Notice>
        </chakra.div>
      ) : null}
      <Button
        type="submit"
        size="large"
        wide="yes"
        busy={(pay.isPending || pay.isSuccess) && 'Holding stock and date'}
      >
        Pay {formatMoneyExact(plan.totalMinor)}
      </Button>
      <chakra.p color="slate" fontSize="sm" marginTop="3">
        Stock and date are held for you while you pay on our payment provider’s page.
      </chakra.p>
    </chakra.form>
  );
}
