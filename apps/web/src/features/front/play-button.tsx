import { Button } from '../../components/button';

export interface PlayButtonProps {
  paused: boolean;
  onChange: (paused: boolean) => void;
}

/** Stops what moves and sets it going again. */
export function PlayButton({ paused, onChange }: PlayButtonProps) {
  return (
    <Button tone="quiet" alignSelf="center" paddingInline="4" onClick={() => onChange(!paused)}>
      <svg width="14" height="14" viewBox="0 0 14 14" aria-hidden="true" fill="currentColor">
        {paused ? <path d="M3 1.500v11l9.500-5.500Z" /> : <path d="M2 1h3.500v12H2zM8.500 1H12v12H8.500z" />}
      </svg>
      {paused ? 'Play' : 'Pause'}
    </Button>
  );
}
