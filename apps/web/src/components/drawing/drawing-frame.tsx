import { useId, type CSSProperties, type ReactNode } from 'react';
import type { Box } from './shapes';

export interface DrawingFrameProps {
  /** What part of the millimetre plane is shown. */
  box: Box;
  title: string;
  /** The same as the dimensions say, in words. */
  description: string;
  /** The largest scale, screen pixels to a millimetre: small things do not fill a wide place. */
  maxScale?: number;
  children: ReactNode;
}

/**
 * An SVG in millimetres that is as wide as its place. `--drawing-px` is one screen pixel in millimetres: a tangent
 * turns the two lengths into a bare number, which `calc` cannot do everywhere.
 */
export function DrawingFrame({ box, title, description, maxScale = 3.4, children }: DrawingFrameProps) {
  const id = useId();
  const width = box.x2 - box.x1;
  const height = box.y2 - box.y1;
  const style = {
    '--drawing-px': `tan(atan2(${width}px, 100cqw))`,
    width: '100%',
    height: 'auto',
  } as CSSProperties;
  return (
    <div style={{ containerType: 'inline-size', width: `min(100%, ${Math.round(width * maxScale)}px)` }}>
      <svg
        viewBox={`${box.x1} ${box.y1} ${width} ${height}`}
        style={style}
        role="img"
        aria-labelledby={`${id}title`}
        aria-describedby={`${id}desc`}
        focusable="false"
      >
        <title id={`${id}title`}>{title}</title>
        <desc id={`${id}desc`}>{description}</desc>
        {children}
      </svg>
    </div>
  );
}
