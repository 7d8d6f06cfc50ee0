import { chakra } from '@chakra-ui/react';
import { useEffect, useRef } from 'react';

export interface FieldFault {
  /** The id of the field to go to. */
  fieldId: string;
  message: string;
}

export interface ErrorSummaryProps {
  faults: readonly FieldFault[];
  /** Counts the attempts to send: each failed one brings the focus here again. */
  attempt: number;
}

function goTo(fieldId: string): void {
  const field = document.getElementById(fieldId);
  field?.closest('fieldset, div')?.scrollIntoView({ block: 'start' });
  field?.focus({ preventScroll: true });
}

/** On top of a form that was sent with faults: says how many, links to each. Shows nothing while all is well. */
export function ErrorSummary({ faults, attempt }: ErrorSummaryProps) {
  const box = useRef<HTMLDivElement>(null);
  const served = useRef(0);
  useEffect(() => {
    // The faults may come a render later than the attempt: the box is waited for.
    if (attempt === served.current || !box.current) return;
    served.current = attempt;
    box.current.focus();
  });
  if (faults.length === 0) return null;
  const title =
    faults.length === 1 ? 'One answer needs another look' : `${faults.length} answers need another look`;
  return (
    <chakra.div
      ref={box}
      tabIndex={-1}
      role="alert"
      aria-labelledby="error-summary-title"
      borderWidth="2px"
      borderColor="brick"
      borderRadius="card"
      bg="paper"
      padding="4"
      marginBottom="6"
    >
      <chakra.h2 id="error-summary-title" fontSize="lg" fontWeight="bold">
        {title}
      </chakra.h2>
      <ul>
        {faults.map(({ fieldId, message }) => (
          <li key={`${fieldId} ${message}`}>
            <chakra.a
              href={`#${fieldId}`}
              display="inline-flex"
              alignItems="center"
              minHeight="target"
              color="brick"
              fontWeight="medium"
              textDecoration="underline"
              textUnderlineOffset="0.2em"
              onClick={(event) => {
                event.preventDefault();
                goTo(fieldId);
              }}
            >
              {message}
            </chakra.a>
          </li>
        ))}
      </ul>
    </chakra.div>
  );
}
