import { chakra } from '@chakra-ui/react';
import { VisuallyHidden } from '../../components/visually-hidden';
import { chooseMode, colourModes, useColourMode, type ColourMode } from '../../lib/colour-mode';

const names: Record<ColourMode, string> = { light: 'Light', dark: 'Dark', system: 'Same as system' };

const Icon = ({ mode }: { mode: ColourMode }) => (
  <svg
    width="20"
    height="20"
    viewBox="0 0 20 20"
    fill="none"
    stroke="currentColor"
    strokeWidth="1.8"
    aria-hidden="true"
  >
    {mode === 'light' ? (
      <>
        <circle cx="10" cy="10" r="3.6" />
        <path
          strokeLinecap="round"
          d="M10 1.8v2M10 16.2v2M1.8 10h2M16.2 10h2M4.2 4.2l1.4 1.4M14.4 14.4l1.4 1.4M15.8 4.2l-1.4 1.4M5.6 14.4l-1.4 1.4"
        />
      </>
    ) : mode === 'dark' ? (
      <path strokeLinejoin="round" d="M16.8 12.3A7.2 7.2 0 0 1 7.7 3.2a7.2 7.2 0 1 0 9.1 9.1Z" />
    ) : (
      <>
        <circle cx="10" cy="10" r="7" />
        <path d="M10 3a7 7 0 0 1 0 14Z" fill="currentColor" />
      </>
    )}
  </svg>
);

const Choice = chakra('label', {
  base: {
    display: 'grid',
    placeItems: 'center',
    minWidth: 'target',
    minHeight: 'target',
    color: 'slate',
    cursor: 'pointer',
    borderBlockWidth: '2px',
    borderColor: 'transparent',
    _hover: { color: 'ink' },
    '&:has(:checked)': { color: 'ink', borderBottomColor: 'bracken' },
    '@media (forced-colors: active)': {
      borderColor: 'Canvas',
      '&:has(:checked)': { borderBottomColor: 'Highlight' },
    },
    '&:has(:focus-visible)': { outline: '3px solid', outlineColor: 'tarn' },
  },
});

/** Light, dark or as the system does: three radios behind our own signs. */
export function ColourModeSwitch() {
  const chosen = useColourMode();
  return (
    <chakra.fieldset display="flex">
      <legend>
        <VisuallyHidden>Colours</VisuallyHidden>
      </legend>
      {colourModes.map((mode) => (
        <Choice key={mode} title={names[mode]}>
          <VisuallyHidden>
            <input
              type="radio"
              name="colour-mode"
              checked={chosen === mode}
              onChange={() => chooseMode(mode)}
              value={mode}
            />
            {names[mode]}
          </VisuallyHidden>
          <Icon mode={mode} />
        </Choice>
      ))}
    </chakra.fieldset>
  );
}
