import { useState } from 'react';
import { TextLink } from '../../../components/text-link';
import { formatFigure } from '../../../lib/format-figure';
import { airOut, coilOff, asPrinted } from '../cautions';
import { DrawingSheet } from '../../../components/drawing-sheet';
import { rearEndPose, travelMm } from '../figures/rear-end';
import { RearEndDrawing } from '../figures/rear-end-drawing';
import { HelpPage } from '../help-page';
import { FigureTable, Prose } from '../prose';
import { Stations } from '../stations';

const positions = [
  { value: 0, label: 'Extended' },
  { value: travelMm / 2, label: 'Half way' },
  { value: travelMm, label: 'Fully in' },
] as const;

const examples: readonly (readonly [number, number])[] = [
  [120, 50],
  [140, 55],
  [150, 60],
  [170, 65],
];

export function StrokePage() {
  const [wheelMm, setWheelMm] = useState<number>(travelMm / 2);
  const { strokeMm, shockMm } = rearEndPose(wheelMm);
  return (
    <HelpPage
      path="/help/stroke-is-not-travel"
      lead="Stroke is how far the shock shortens. Travel is how far the rear wheel moves up. The linkage between them sets the relation."
      cautions={[...airOut, coilOff, asPrinted]}
    >
      <DrawingSheet
        caption="An invented frame with 140 mm of travel on a 210 × 55 shock, drawn to scale."
        controls={
          <Stations
            label="Position of the wheel"
            stations={positions}
            value={wheelMm}
            onChange={setWheelMm}
          />
        }
        block={[
          { label: 'Wheel up', text: `${formatFigure(wheelMm)} mm` },
          { label: 'Stroke used', text: `${formatFigure(strokeMm, 1)} mm` },
          { label: 'Eye-to-eye', text: `${formatFigure(shockMm, 1)} mm` },
        ]}
      >
        <RearEndDrawing wheelMm={wheelMm} />
      </DrawingSheet>
      <Prose>
        <h2>Two figures, one linkage</h2>
        <p>
          Travel divided by stroke is the mean leverage ratio. It says how hard the frame leans on the shock.
          Two bikes with the same travel can need different strokes, and the same shock gives different travel
          in different frames. So travel alone never tells which shock fits.
        </p>
        <FigureTable>
          <caption>Mean leverage ratio</caption>
          <thead>
            <tr>
              <th scope="col">Travel, mm</th>
              <th scope="col" className="figure">
                Stroke, mm
              </th>
              <th scope="col" className="figure">
                Ratio
              </th>
            </tr>
          </thead>
          <tbody>
            {examples.map(([travel, stroke]) => (
              <tr key={travel}>
                <th scope="row">{travel}</th>
                <td className="figure">{stroke}</td>
                <td className="figure">{(travel / stroke).toFixed(2)}</td>
              </tr>
            ))}
          </tbody>
        </FigureTable>
        <h2>A longer stroke is no gift</h2>
        <p>
          The wheel would go further than its maker meant it to: links can touch, and the tyre can hit the
          frame. A shorter stroke loses travel and ends earlier. Either may void the warranty. So we match
          stroke exactly to what the frame’s maker lists. Some shocks can be shortened from inside in steps of
          2.5 mm by travel spacers; that is work for a workshop.
        </p>
        <h2>How to measure it</h2>
        <ul>
          <li>
            <b>The surest way:</b> eye-to-eye extended, then eye-to-eye with all air out and pushed together.
            The difference is the stroke. What keeps it from closing fully, a bumper or leftover air, takes up
            to 2 mm; we reckon with it.
          </li>
          <li>
            <b>By the ring on the shaft:</b> after a ride it shows only the stroke that was used. It counts as
            the least it can be, not as the whole.
          </li>
        </ul>
        <p>
          The metric strokes of one length lie 2.5 mm apart. A tape cannot tell them for certain; a caliper
          can. See how to measure <TextLink to="/help/eye-to-eye">eye-to-eye</TextLink>.
        </p>
        <h2>Sag: always say of what</h2>
        <p>
          Sag is how far the suspension settles under you. At the shock it is a share of the stroke, at the
          wheel a share of the travel, and the two shares differ a little wherever the leverage changes on the
          way, as in the drawing: half of the travel is not exactly half of the stroke. Our figures are at the
          shock.
        </p>
      </Prose>
    </HelpPage>
  );
}
