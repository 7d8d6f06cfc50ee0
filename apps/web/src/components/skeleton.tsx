import { chakra } from '@chakra-ui/react';
import { VisuallyHidden } from './visually-hidden';

const Bar = chakra('span', {
  base: {
    display: 'block',
    bg: 'hair',
    borderRadius: 'control',
    animation: 'breathe 1.6s ease-in-out infinite',
  },
});

/** Stands where text will be: `lines` bars, the last one shorter. */
export function Skeleton({ lines = 3, what = 'Loading' }: { lines?: number; what?: string }) {
  return (
    <div role="status" aria-busy="true">
      <VisuallyHidden>{what}</VisuallyHidden>
      {Array.from({ length: lines }, (_, index) => (
        <Bar key={index} height="4" marginBottom="3" width={index === lines - 1 ? '60%' : '100%'} />
      ))}
    </div>
  );
}

/** Stands where a drawing will be, in its proportions. */
export function DrawingSkeleton({ ratio = 2.4 }: { ratio?: number }) {
  return <Bar aria-hidden="true" width="full" aspectRatio={ratio} borderRadius="card" />;
}
