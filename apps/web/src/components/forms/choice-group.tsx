import { chakra } from '@chakra-ui/react';
import type { ReactNode, Ref } from 'react';
import { FieldError, FieldHint } from './field';

export interface Choice<V extends string> {
  value: V;
  label: ReactNode;
  hint?: ReactNode;
  /** A drawing above the words. */
  figure?: ReactNode;
}

export interface ChoiceGroupProps<V extends string> {
  /** Of the first radio too, so that an error summary can lead there. */
  id: string;
  name: string;
  legend: ReactNode;
  hint?: ReactNode;
  error?: string;
  choices: readonly Choice<V>[];
  value: V | null;
  onChange: (value: V) => void;
  /** "row" for short words side by side, "cards" for drawings. */
  layout?: 'list' | 'row' | 'cards';
  ref?: Ref<HTMLFieldSetElement>;
}

const Card = chakra('label', {
  base: {
    position: 'relative',
    display: 'flex',
    gap: '3',
    minHeight: 'target',
    paddingBlock: '3',
    paddingInline: '4',
    bg: 'paper',
    borderWidth: '1px',
    borderColor: 'rule',
    borderRadius: 'control',
    cursor: 'pointer',
    _hover: { borderColor: 'ink' },
    '&:has(:checked)': { borderColor: 'ink', boxShadow: 'inset 0 0 0 1px currentColor' },
    '&:has(:focus-visible)': { outline: '3px solid', outlineColor: 'tarn', outlineOffset: '2px' },
    '& input': {
      position: 'absolute',
      opacity: '0',
      inset: '0',
      width: 'full',
      height: 'full',
      cursor: 'pointer',
    },
  },
});

/** Our own mark of what is chosen: a ring that gets its bolt. */
const Ring = () => (
  <chakra.svg
    viewBox="0 0 20 20"
    width="20px"
    height="20px"
    marginTop="2px"
    flexShrink="0"
    aria-hidden="true"
  >
    <circle cx="10" cy="10" r="8.5" fill="none" stroke="currentColor" strokeWidth="1.6" />
    <circle className="bolt" cx="10" cy="10" r="4.6" fill="var(--lf-colors-bracken)" opacity="0" />
  </chakra.svg>
);

const layouts = {
  list: { display: 'grid', gap: '2' },
  row: { display: 'flex', flexWrap: 'wrap', gap: '2' },
  cards: {
    display: 'grid',
    gap: '3',
    gridTemplateColumns: 'repeat(auto-fill, minmax(min(100%, 9rem), 1fr))',
  },
} as const;

/** One of several: native radios, drawn as cards. Arrow keys work as the browser has them. */
export function ChoiceGroup<V extends string>(props: ChoiceGroupProps<V>) {
  const { id, name, legend, hint, error, choices, value, onChange, layout = 'list', ref } = props;
  const described = [hint ? `${id}-hint` : '', error ? `${id}-error` : ''].filter(Boolean).join(' ');
  return (
    <chakra.fieldset ref={ref} marginBottom="6" aria-describedby={described || undefined}>
      <chakra.legend fontWeight="bold">{legend}</chakra.legend>
      {hint ? <FieldHint id={`${id}-hint`}>{hint}</FieldHint> : null}
      {error ? <FieldError id={`${id}-error`}>{error}</FieldError> : null}
      <chakra.div marginTop="2" css={{ ...layouts[layout], '& input:checked ~ * .bolt': { opacity: 1 } }}>
        {choices.map((choice, index) => (
          <Card key={choice.value} flexDirection={choice.figure ? 'column' : 'row'}>
            <input
              type="radio"
              id={index === 0 ? id : `${id}-${choice.value}`}
              name={name}
              value={choice.value}
              checked={value === choice.value}
              onChange={() => onChange(choice.value)}
              aria-invalid={error ? true : undefined}
            />
            {choice.figure ?? null}
            <ChoiceText choice={choice} />
          </Card>
        ))}
      </chakra.div>
    </chakra.fieldset>
  );
}

function ChoiceText<V extends string>({ choice }: { choice: Choice<V> }) {
  return (
    <chakra.span display="flex" columnGap="3" width="full">
      <Ring />
      <chakra.span flex="1" minWidth="0">
        <chakra.span display="block" fontWeight="medium">
          {choice.label}
        </chakra.span>
        {choice.hint ? (
          <chakra.span display="block" fontSize="sm" color="slate">
            {choice.hint}
          </chakra.span>
        ) : null}
      </chakra.span>
    </chakra.span>
  );
}
