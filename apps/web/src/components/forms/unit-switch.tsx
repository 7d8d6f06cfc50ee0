import { chakra } from '@chakra-ui/react';
import { VisuallyHidden } from '../visually-hidden';

const Cell = chakra('label', {
  base: {
    position: 'relative',
    display: 'grid',
    placeItems: 'center',
    minWidth: '3.25rem',
    paddingInline: '3',
    borderLeftWidth: '1px',
    borderColor: 'hair',
    color: 'slate',
    fontWeight: 'bold',
    cursor: 'pointer',
    _last: { borderRightRadius: '4px' },
    // Our tokens are the reader's own colours in that mode; its adjustment would take the ground away.
    '&:has(:checked)': { bg: 'ink', color: 'paper', forcedColorAdjust: 'none' },
    '&:has(:focus-visible)': { outline: '3px solid', outlineColor: 'tarn', outlineOffset: '2px' },
  },
});

export interface UnitSwitchProps<U extends string> {
  id: string;
  units: readonly U[];
  unit: U;
  onChange: (unit: U) => void;
}

/** The units of one figure side by side; a single one is only a word. */
export function UnitSwitch<U extends string>({ id, units, unit, onChange }: UnitSwitchProps<U>) {
  if (units.length < 2) {
    return (
      <chakra.span display="grid" placeItems="center" paddingInline="4" color="slate" fontWeight="bold">
        {unit}
      </chakra.span>
    );
  }
  return (
    <chakra.fieldset display="flex">
      <VisuallyHidden as="legend">Unit</VisuallyHidden>
      {units.map((each) => (
        <Cell key={each}>
          <VisuallyHidden>
            <input
              type="radio"
              name={`${id}-unit`}
              value={each}
              checked={each === unit}
              onChange={() => onChange(each)}
            />
          </VisuallyHidden>
          {each}
        </Cell>
      ))}
    </chakra.fieldset>
  );
}
