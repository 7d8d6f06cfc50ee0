import type { Verdict } from '@linkfell/contracts';
import type { ReactNode } from 'react';

const shapes: Record<Verdict, ReactNode> = {
  // A bolt's head from above, with its washer face.
  'bolts-straight-in': (
    <>
      <path d="M12 2.2 20.500 7.100v9.800L12 21.800 3.500 16.900V7.100Z" />
      <circle cx="12" cy="12" r="4.4" />
    </>
  ),
  // The same head with a spanner's notch cut into it.
  'fits-with-work': (
    <path d="M8.200 4.400 12 2.200 20.500 7.100v9.800L12 21.800 3.500 16.900V7.100l1-.6V12L9 14.600 13.400 12V6.900L8.200 4.400Z" />
  ),
  // An open circle with a question.
  'needs-an-answer': (
    <>
      <path d="M18.600 19.200A9.800 9.800 0 1 0 14.500 21.500" />
      <path d="M9.200 9.400a2.900 2.900 0 1 1 4.300 2.600c-1 .6-1.500 1.100-1.500 2.300M12 17.400v.2" />
    </>
  ),
  // A barred circle.
  'wont-fit': (
    <>
      <circle cx="12" cy="12" r="9.800" />
      <path d="M5.200 18.800 18.800 5.200" />
    </>
  ),
};

/** The outline shape of a verdict, in the colour of the text around it. Silent: the word stands beside it. */
export function VerdictShape({ verdict, size = 18 }: { verdict: Verdict; size?: number }) {
  return (
    <svg
      width={size}
      height={size}
      viewBox="0 0 24 24"
      fill="none"
      stroke="currentColor"
      strokeWidth="2.2"
      strokeLinejoin="round"
      strokeLinecap="round"
      aria-hidden="true"
      focusable="false"
      style={{ flexShrink: 0 }}
    >
      {shapes[verdict]}
    </svg>
  );
}
