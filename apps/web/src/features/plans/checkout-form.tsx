import { checkoutBody, type PlanView } from '@linkfell/contracts';
import { standardSchemaResolver } from '@hookform/resolvers/standard-schema';
import { chakra } from '@chakra-ui/react';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useEffect, useState, type ComponentProps } from 'react';
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
import { applyProblem } from '../../lib/apply-problem';
import { formatMoneyExact } from '../../lib/format-money';
import { usePageTitle } from '../../lib/page-title';
import { checkout } from './api';

const form = checkoutBody.omit({ totalMinor: true });
type Form = z.input<typeof form>;
type ContactName = keyof Form['contact'];

const fields = [
  'contact.name',
  'contact.email',
  'contact.phone',
  'contact.street',
  'contact.town',
  'contact.postcode',
  'acceptTerms',
] as const;

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

/** The server's own words stand where they were said; the schema's about a box that is not ticked are ours. */
const termsFault = ({ type, message }: { type?: string; message?: string }): string =>
  type === 'server' && message ? message : 'Tick the box to accept the terms';

/**
 * Contact and terms on one page, seven fields; then the payment page. No account is needed. The fields stay while
 * the plan is not ready to be paid, so that nothing typed is lost when somebody else was quicker.
 */
export function CheckoutForm({
  plan,
  ready,
  keeping,
}: {
  plan: PlanView;
  ready: boolean;
  /** A choice is on its way to the server: what would be paid is not known yet. */
  keeping: boolean;
}) {
  const queries = useQueryClient();
  const [attempt, setAttempt] = useState(0);
  // One key for one try: a press repeated on a bad line finds the first answer, a try after a refusal is new.
  const [key, setKey] = useState(() => crypto.randomUUID());
  const { register, handleSubmit, formState, getValues, setError } = useForm<Form>({
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
        `${key}-${plan.totalMinor}-${plan.revision}`,
      ),
    onSuccess: ({ paymentUrl }) => window.location.assign(paymentUrl),
    onError: (error) => {
      if (isApiProblem(error)) setKey(crypto.randomUUID());
      if (isApiProblem(error) && error.errors.length > 0) {
        applyProblem(error, setError, { fields, otherwise: 'acceptTerms' });
        setAttempt((count) => count + 1);
      }
      void queries.invalidateQueries({ queryKey: ['plan', plan.id] });
    },
  });
  const { reset } = pay;
  useEffect(() => {
    // Back from the payment page the browser may show this page as it was left: busy.
    const shown = ({ persisted }: PageTransitionEvent) => persisted && reset();
    window.addEventListener('pageshow', shown);
    return () => window.removeEventListener('pageshow', shown);
  }, [reset]);
  const { errors } = formState;
  const faults = [
    ...inputs.flatMap(({ name }) => {
      const message = errors.contact?.[name]?.message;
      return message ? [{ fieldId: name, message }] : [];
    }),
    ...(errors.acceptTerms?.message
      ? [{ fieldId: 'acceptTerms', message: termsFault(errors.acceptTerms) }]
      : []),
  ];
  usePageTitle(`Plan: ${plan.shock.modelName}`, { error: faults.length > 0 });
  return (
    <chakra.form
      noValidate
      maxWidth="form"
      onSubmit={(event) =>
        void handleSubmit(
          () => keeping || pay.isPending || pay.mutate(),
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
        error={errors.acceptTerms ? termsFault(errors.acceptTerms) : undefined}
        label={
          <>
            I accept the <TextLink to="/terms">terms</TextLink> and have read the cautions above
          </>
        }
        {...register('acceptTerms')}
      />
      {pay.error && faults.length === 0 ? (
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
      {ready ? (
        <Button
          type="submit"
          size="large"
          wide="yes"
          busy={
            keeping ? 'Keeping your choice' : (pay.isPending || pay.isSuccess) && 'Holding stock and date'
          }
        >
          Pay {formatMoneyExact(plan.totalMinor)}
        </Button>
      ) : null}
      <chakra.p color="slate" fontSize="sm" marginTop="3">
        Stock and date are held for you while you pay on our payment provider’s page.
      </chakra.p>
    </chakra.form>
  );
}
