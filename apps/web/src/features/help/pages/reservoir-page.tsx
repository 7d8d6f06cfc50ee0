import { useState } from 'react';
import { ShockDrawing } from '../../../components/drawing/shock-drawing';
import { commonSheet } from '../../../components/drawing/sheet';
import { TextLink } from '../../../components/text-link';
import { asPrinted, askMechanic } from '../cautions';
import { DrawingSheet } from '../../../components/drawing-sheet';
import { inlineAir, withReservoir } from '../figures/example-shocks';
import { HelpPage } from '../help-page';
import { Prose } from '../prose';
import { Stations } from '../stations';

const positions = [
  { value: 0, label: 'Above' },
  { value: 90, label: 'To the side' },
  { value: 180, label: 'Below' },
] as const;

const turned = (positionDeg: number) => ({
  ...withReservoir,
  reservoir: { lengthMm: 96, diameterMm: 38, positionDeg },
});
const sheet = commonSheet([turned(0), turned(180)], ['reservoir-length', 'reservoir-diameter']);

export function ReservoirPage() {
  const [position, setPosition] = useState<number>(0);
  return (
    <HelpPage
      path="/help/reservoir"
      lead="A second chamber of damper oil beside the body, also called a piggyback. More oil takes up more heat, so the damping stays the same on a long descent."
      cautions={[
        'The gas behind the oil is under high pressure: never touch the damper’s gas valve and never open a reservoir. That is workshop work.',
        asPrinted,
        askMechanic,
      ]}
    >
      <DrawingSheet
        caption="A shock with a reservoir in three turned positions. Without it, the same shock is called inline."
        controls={
          <Stations
            label="Position of the reservoir"
            stations={positions}
            value={position}
            onChange={setPosition}
          />
        }
        block={[
          { label: 'Long', text: '96 mm' },
          { label: 'Across', text: '38 mm' },
          { label: 'Turned by', text: `${position}°` },
        ]}
      >
        <ShockDrawing
          figure={turned(position)}
          dimensions={['reservoir-length', 'reservoir-diameter']}
          asked="reservoir-length"
          sheet={sheet}
        />
      </DrawingSheet>
      <Prose>
        <h2>When it helps</h2>
        <p>
          On long or fast descents, for heavier riders, and on e-bikes. On short climbs and flowing trails a
          sound inline shock does the same work and weighs less.
        </p>
        <h2>It needs room, over the whole stroke</h2>
        <p>
          The shock swings in the frame as it works, and links move past it. At least 3 mm must stay free all
          round at every point of the stroke; 5 mm is comfortable. We take it from, in this order:
        </p>
        <ol>
          <li>the frame maker’s plain word, “fits” or “inline only”: a “no” always wins;</li>
          <li>the outlines on the frame sheet, moved through the whole stroke;</li>
          <li>the room that you measured, less what your reading can be out.</li>
        </ol>
        <p>If none of them answers, it is “not known”, and we say what to measure or whom to ask.</p>
      </Prose>
      <DrawingSheet caption="Inline: no reservoir check is needed, but the can’s diameter, its valve and its lever still count.">
        <ShockDrawing figure={inlineAir} dimensions={['diameter']} asked="diameter" />
      </DrawingSheet>
      <Prose>
        <h2>Measuring the room</h2>
        <p>
          With the present shock in place, measure where the reservoir would sit: how wide a round thing may
          be there, and how long. Think of the bottle, of the hose, and of the frame when the wheel is right
          up. A caliper or ruler will do; say which you used.
        </p>
        <p>
          Not sure whether yours has one? Start with <TextLink to="/help/eye-to-eye">its size</TextLink>; the
          drawing in the measure-up grows with your answers.
        </p>
      </Prose>
    </HelpPage>
  );
}
