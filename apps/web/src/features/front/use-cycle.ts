import { useEffect, useRef, useState } from 'react';

const periodMs = 7000;
const frameMs = 33;

/** Down with a soft start and stop, a moment of rest, and back: 0 to 1 to 0 over one turn. */
export function cyclePosition(turn: number): number {
  const part = turn % 1;
  const eased = (at: number) => (1 - Math.cos(Math.PI * Math.min(1, Math.max(0, at)))) / 2;
  return part < 0.5 ? eased(part / 0.4) : 1 - eased((part - 0.55) / 0.4);
}

/**
 * A slow cycle for a drawing, in fractions of the stroke. It begins after the page has settled, rests while the tab
 * is hidden, and goes on from where it stopped.
 */
export function useCycle(running: boolean): number {
  const [position, setPosition] = useState(0);
  const turn = useRef(0);
  useEffect(() => {
    if (!running) return;
    let request = 0;
    let last = 0;
    const frame = (now: number) => {
      request = requestAnimationFrame(frame);
      if (last !== 0 && now - last < frameMs) return;
      // A tab that was hidden does not make up for the time it missed.
      turn.current += last === 0 ? 0 : Math.min(now - last, 100) / periodMs;
      last = now;
      setPosition(cyclePosition(turn.current));
    };
    const start = setTimeout(() => (request = requestAnimationFrame(frame)), 600);
    return () => {
      clearTimeout(start);
      cancelAnimationFrame(request);
    };
  }, [running]);
  return position;
}
