import { chakra } from '@chakra-ui/react';

const Station = chakra('button', {
  base: {
    minHeight: 'target',
    paddingInline: { base: '3', sm: '4' },
    borderWidth: '1px',
    borderColor: 'rule',
    marginLeft: '-1px',
    bg: 'paper',
    color: 'slate',
    fontWeight: 'bold',
    lineHeight: 'heading',
    cursor: 'pointer',
    _first: { borderLeftRadius: 'control', marginLeft: '0' },
    _last: { borderRightRadius: 'control' },
    '&[aria-pressed=false]:hover': { color: 'ink', bg: 'wash' },
    _focusVisible: { position: 'relative' },
    // As in the unit switch: our tokens are the reader's own colours in that mode.
    '&[aria-pressed=true]': { bg: 'ink', color: 'paper', borderColor: 'ink', forcedColorAdjust: 'none' },
  },
});

export interface StationsProps<V> {
  /** What is chosen, for those who hear the page. */
  label: string;
  stations: readonly { value: V; label: string }[];
  value: V;
  onChange: (value: V) => void;
}

/** A few positions of a drawing as buttons side by side: nothing to drag. */
export function Stations<V extends string | number>({ label, stations, value, onChange }: StationsProps<V>) {
  return (
    <chakra.div role="group" aria-label={label} display="flex">
      {stations.map((station) => (
        <Station
          key={station.value}
          type="button"
          aria-pressed={station.value === value}
          onClick={() => onChange(station.value)}
        >
          {station.label}
        </Station>
      ))}
    </chakra.div>
  );
}
