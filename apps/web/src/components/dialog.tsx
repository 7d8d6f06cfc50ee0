import { chakra } from '@chakra-ui/react';
import { useEffect, useId, useRef, type ReactNode } from 'react';
import { Button } from './button';

const Frame = chakra('dialog', {
  base: {
    margin: 'auto',
    width: 'min(36rem, calc(100vw - 2rem))',
    maxHeight: 'calc(100dvh - 2rem)',
    overflowY: 'auto',
    bg: 'paper',
    color: 'ink',
    borderRadius: 'card',
    borderWidth: '1px',
    borderColor: 'rule',
    boxShadow: 'float',
    padding: '6',
    '&::backdrop': { background: 'rgb(10 20 26 / 0.5)' },
  },
});

export interface DialogProps {
  open: boolean;
  title: string;
  onClose: () => void;
  children: ReactNode;
  closeLabel?: string;
}

/** The browser's own modal: it holds the focus, Escape closes it, and the focus returns to where it was. */
export function Dialog({ open, title, onClose, children, closeLabel = 'Close' }: DialogProps) {
  const dialog = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  useEffect(() => {
    if (open && !dialog.current?.open) dialog.current?.showModal();
    if (!open && dialog.current?.open) dialog.current.close();
  }, [open]);
  return (
    <Frame ref={dialog} aria-labelledby={titleId} onClose={onClose}>
      <chakra.h2 id={titleId} fontSize="xl" fontWeight="heavy" lineHeight="heading" marginBottom="3">
        {title}
      </chakra.h2>
      {children}
      <chakra.div marginTop="6">
        <Button tone="plain" onClick={onClose}>
          {closeLabel}
        </Button>
      </chakra.div>
    </Frame>
  );
}
