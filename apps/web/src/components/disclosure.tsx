import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';

const Summary = chakra('summary', {
  base: {
    display: 'inline-flex',
    alignItems: 'center',
    gap: '2',
    minHeight: 'target',
    color: 'tarn',
    fontWeight: 'bold',
    cursor: 'pointer',
    listStyle: 'none',
    '&::-webkit-details-marker': { display: 'none' },
    '& svg': { transition: 'transform 150ms' },
    _hover: { color: 'tarnDeep' },
  },
});

/** "Where do I find this?": more for those who ask. The browser's own details, findable in the page. */
export function Disclosure({
  summary,
  children,
  open,
}: {
  summary: ReactNode;
  children: ReactNode;
  open?: boolean;
}) {
  return (
    <chakra.details
      open={open}
      marginBottom="6"
      css={{ '&[open] > summary svg': { transform: 'rotate(90deg)' } }}
    >
      <Summary>
        <svg width="12" height="12" viewBox="0 0 12 12" aria-hidden="true">
          <path
            d="M3 1 9 6 3 11"
            fill="none"
            stroke="currentColor"
            strokeWidth="2.2"
            strokeLinejoin="round"
            strokeLinecap="round"
          />
        </svg>
        {summary}
      </Summary>
      <chakra.div borderLeftWidth="1px" borderColor="rule" marginLeft="5px" paddingLeft="5" paddingBlock="2">
        {children}
      </chakra.div>
    </chakra.details>
  );
}
