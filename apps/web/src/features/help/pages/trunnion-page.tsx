import { MountDrawing } from '../../../components/drawing/mount-drawing';
import { ShockDrawing } from '../../../components/drawing/shock-drawing';
import { TextLink } from '../../../components/text-link';
import { asPrinted, askMechanic, coilOff, stopRiding } from '../cautions';
import { DrawingSheet } from '../../../components/drawing-sheet';
import { inlineAir, trunnion } from '../figures/example-shocks';
import { HelpPage } from '../help-page';
import { FigureTable, Prose } from '../prose';

const lengths: readonly (readonly [number, number, string])[] = [
  [190, 165, '37.5 to 45'],
  [210, 185, '47.5 to 55'],
  [230, 205, '57.5 to 65'],
  [250, 225, '67.5 to 75'],
];

export function TrunnionPage() {
  return (
    <HelpPage
      path="/help/trunnion"
      lead="Threaded holes in either side of the shock’s body take two bolts that belong to the frame. There is no eye and no bush at that end."
      cautions={[asPrinted, coilOff, askMechanic, stopRiding]}
    >
      <DrawingSheet
        caption="A trunnion shock, 185 × 55. Grey behind it an eyelet shock of the same stroke, 210 × 55."
        block={[
          { label: 'Trunnion', text: '185 mm' },
          { label: 'Eyelet', text: '210 mm' },
          { label: 'Shorter by', text: '25 mm' },
        ]}
      >
        <ShockDrawing
          figure={trunnion}
          behind={inlineAir}
          dimensions={['eye-to-eye', 'stroke']}
          asked="eye-to-eye"
          title="A trunnion shock before an eyelet shock of the same stroke"
        />
      </DrawingSheet>
      <Prose>
        <h2>How to recognise one</h2>
        <p>
          Look at the end with the can or the damper body. If one bolt goes right through a round eye, it is
          an eyelet. If two short bolts come in, one from each side, and none goes through, it is a trunnion.
          The shaft end always has an eye.
        </p>
      </Prose>
      <DrawingSheet caption="Cut along the bolts: the frame’s two bolts end in the body of the shock.">
        <MountDrawing figure={{ kind: 'trunnion' }} />
      </DrawingSheet>
      <Prose>
        <h2>It fits a trunnion frame, and no other</h2>
        <p>
          Frame and shock must both be made for it, each end compared by itself. No kit turns a trunnion into
          an eyelet or back. Eye-to-eye is measured from the axis of the trunnion bolts, and in the metric
          sizes it is 25 mm less than that of the eyelet shock with the same stroke. So <b>185x55</b> and{' '}
          <b>210x55</b> are not the same shock in two lengths: each fits frames that the other does not.
        </p>
        <FigureTable>
          <caption>The same strokes, two lengths</caption>
          <thead>
            <tr>
              <th scope="col">Strokes, mm</th>
              <th scope="col" className="figure">
                Eyelet, mm
              </th>
              <th scope="col" className="figure">
                Trunnion, mm
              </th>
            </tr>
          </thead>
          <tbody>
            {lengths.map(([eyelet, short, strokes]) => (
              <tr key={eyelet}>
                <th scope="row">{strokes}</th>
                <td className="figure">{eyelet}</td>
                <td className="figure">{short}</td>
              </tr>
            ))}
          </tbody>
        </FigureTable>
        <h2>What you need with it</h2>
        <p>
          At the trunnion end nothing: the two bolts are the frame’s own. At the eye end a new shock needs{' '}
          <TextLink to="/help/hardware">mounting hardware</TextLink>, unless that eye holds its own bearing.
          Bolts that the maker calls single-use are replaced. Grease or thread-lock goes on only where the
          maker says so, and the printed torque holds for that condition.
        </p>
      </Prose>
    </HelpPage>
  );
}
