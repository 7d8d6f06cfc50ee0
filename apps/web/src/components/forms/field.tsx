import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { VisuallyHidden } from '../visually-hidden';

/** What a control inside a field must carry, so that label, hint and fault are read out with it. */
export interface ControlProps {
  id: string;
  'aria-describedby': string | undefined;
  'aria-invalid': true | undefined;
}

export interface FieldProps {
  /** Also the anchor that an error summary links to. */
  id: string;
  label: ReactNode;
  hint?: ReactNode;
  /** The fault in one sentence that says what to do; nothing when the field is in order. */
  error?: string;
  /** Said after the label where a form has both kinds. */
  optional?: boolean;
  children: (control: ControlProps) => ReactNode;
}

const described = (...ids: (string | false | undefined)[]): string | undefined =>
  ids.filter(Boolean).join(' ') || undefined;

/** Label, one-line hint, fault and one control, joined for eyes and screen readers alike. */
export function Field({ id, label, hint, error, optional, children }: FieldProps) {
  return (
    <chakra.div
      marginBottom="6"
      paddingLeft={error ? '3' : '0'}
      borderLeftWidth={error ? '4px' : '0'}
      borderColor="brick"
    >
      <chakra.label htmlFor={id} display="block" fontWeight="bold">
        {label}
        {optional ? ' ' : null}
        {optional ? (
          <chakra.span color="slate" fontWeight="normal">
            (optional)
          </chakra.span>
        ) : null}
      </chakra.label>
      {hint ? <FieldHint id={`${id}-hint`}>{hint}</FieldHint> : null}
      {error ? <FieldError id={`${id}-error`}>{error}</FieldError> : null}
      <chakra.div marginTop="2">
        {children({
          id,
          'aria-describedby': described(hint ? `${id}-hint` : false, error ? `${id}-error` : false),
          'aria-invalid': error ? true : undefined,
        })}
      </chakra.div>
    </chakra.div>
  );
}

export const FieldHint = ({ id, children }: { id: string; children: ReactNode }) => (
  <chakra.p id={id} color="slate" fontSize="sm" maxWidth="line">
    {children}
  </chakra.p>
);

export const FieldError = ({ id, children }: { id: string; children: ReactNode }) => (
  <chakra.p id={id} color="brick" fontWeight="bold">
    <VisuallyHidden>Error:</VisuallyHidden> {children}
  </chakra.p>
);
