import { chakra } from '@chakra-ui/react';
import { Link } from 'react-router-dom';
import { VisuallyHidden } from './visually-hidden';

export type StepState = 'done' | 'now' | 'open';

export interface Step {
  name: string;
  state: StepState;
  /** Where a step that was begun can be looked at again; none for one not reached yet. */
  to?: string;
}

const said: Record<StepState, string> = { done: 'done', now: 'you are here', open: 'not yet' };

const Item = chakra('li', {
  base: { flex: '1', minWidth: '0', borderTopWidth: '4px', fontSize: 'sm', lineHeight: 'heading' },
  variants: {
    state: {
      done: { borderColor: 'ink', color: 'ink' },
      now: { borderColor: 'bracken', color: 'ink', fontWeight: 'bold' },
      open: { borderColor: 'hair', color: 'slate' },
    },
  },
});

const Name = chakra(Link, {
  base: {
    display: 'flex',
    alignItems: 'center',
    minHeight: 'target',
    _hover: { textDecoration: 'underline' },
  },
});

const name = {
  display: { base: 'none', md: 'flex' },
  alignItems: 'center',
  minHeight: 'target',
  paddingRight: '2',
} as const;

/** The steps of a longer way. On a telephone bars only, with the words for screen readers; the page says "Step 2 of 5". */
export function StepList({ label, steps }: { label: string; steps: readonly Step[] }) {
  return (
    <nav aria-label={label}>
      <chakra.ol display="flex" gap="1">
        {steps.map((step) => (
          <Item key={step.name} state={step.state} aria-current={step.state === 'now' ? 'step' : undefined}>
            <chakra.span {...name}>
              {step.to && step.state !== 'now' ? <Name to={step.to}>{step.name}</Name> : step.name}
              <VisuallyHidden>: {said[step.state]}</VisuallyHidden>
            </chakra.span>
            <VisuallyHidden display={{ md: 'none' }}>
              {step.name}: {said[step.state]}
            </VisuallyHidden>
          </Item>
        ))}
      </chakra.ol>
    </nav>
  );
}
