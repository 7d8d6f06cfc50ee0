import { chakra } from '@chakra-ui/react';
import type { ComponentProps } from 'react';
import { buttonRecipe } from './button-recipe';

const Base = chakra('button', buttonRecipe);

export interface ButtonProps extends ComponentProps<typeof Base> {
  /** What is going on while the button's work runs, "Saving". The button stays in the tab order and ignores presses. */
  busy?: string | false;
}

export function Button({ busy = false, children, onClick, type = 'button', ...rest }: ButtonProps) {
  return (
    <Base
      type={type}
      aria-disabled={busy ? true : undefined}
      onClick={(event) => {
        if (busy) event.preventDefault();
        else onClick?.(event);
      }}
      {...rest}
    >
      {busy || children}
    </Base>
  );
}
