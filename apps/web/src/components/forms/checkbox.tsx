import { chakra } from '@chakra-ui/react';
import type { ComponentProps, ReactNode } from 'react';
import { FieldError } from './field';

const Row = chakra('label', {
  base: {
    position: 'relative',
    display: 'flex',
    alignItems: 'flex-start',
    gap: '3',
    minHeight: 'target',
    paddingBlock: '2.5',
    cursor: 'pointer',
    '& input': {
      position: 'absolute',
      opacity: '0',
      width: 'target',
      height: 'target',
      left: '-10px',
      top: '0',
    },
    '& svg': { color: 'slate' },
    '& .tick': { opacity: '0' },
    '& input:checked ~ svg': { color: 'bracken' },
    '& input:checked ~ svg .tick': { opacity: '1' },
    '&:has(:focus-visible) svg': { outline: '3px solid', outlineColor: 'tarn', outlineOffset: '2px' },
  },
});

export interface CheckboxProps extends Omit<ComponentProps<'input'>, 'type'> {
  id: string;
  label: ReactNode;
  hint?: ReactNode;
  error?: string;
}

/** Yes or no: the native box under our own square and tick. */
export function Checkbox({ id, label, hint, error, ...input }: CheckboxProps) {
  return (
    <chakra.div marginBottom="4">
      {error ? <FieldError id={`${id}-error`}>{error}</FieldError> : null}
      <Row>
        <input
          {...input}
          id={id}
          type="checkbox"
          aria-describedby={error ? `${id}-error` : undefined}
          aria-invalid={error ? true : undefined}
        />
        <chakra.svg viewBox="0 0 24 24" width="24px" height="24px" flexShrink="0" aria-hidden="true">
          <rect
            x="1.5"
            y="1.5"
            width="21"
            height="21"
            rx="4"
            fill="var(--lf-colors-paper)"
            stroke="currentColor"
            strokeWidth="2"
          />
          <path
            className="tick"
            d="M6 12.6l4 4L18 7.8"
            fill="none"
            stroke="currentColor"
            strokeWidth="3"
            strokeLinecap="round"
            strokeLinejoin="round"
          />
        </chakra.svg>
        <span>
          {label}
          {hint ? (
            <chakra.span display="block" fontSize="sm" color="slate">
              {hint}
            </chakra.span>
          ) : null}
        </span>
      </Row>
    </chakra.div>
  );
}
