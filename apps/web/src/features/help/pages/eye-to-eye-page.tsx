import { ShockDrawing } from '../../../components/drawing/shock-drawing';
import { TextLink } from '../../../components/text-link';
import { airOut, asPrinted, coilOff } from '../cautions';
import { DrawingSheet } from '../../../components/drawing-sheet';
import { inlineAir } from '../figures/example-shocks';
import { SameEdgeDrawing } from '../figures/same-edge-drawing';
import { HelpPage } from '../help-page';
import { FigureTable, Prose } from '../prose';

export function EyeToEyePage() {
  return (
    <HelpPage
      path="/help/eye-to-eye"
      lead="The length of a shock: the distance between the centres of its two mounting holes, fully extended, in millimetres."
      cautions={[...airOut, coilOff, asPrinted]}
    >
      <DrawingSheet
        caption="An air shock of size 210 × 55, fully extended and at riding pressure."
        block={[
          { label: 'Eye-to-eye', text: '210 mm' },
          { label: 'Stroke', text: '55 mm' },
          { label: 'Written', text: '210x55' },
        ]}
      >
        <ShockDrawing figure={inlineAir} dimensions={['eye-to-eye', 'stroke']} asked="eye-to-eye" />
      </DrawingSheet>
      <Prose>
        <h2>Look for it before you measure it</h2>
        <p>
          Published figures are surer than any ruler. In this order: the frame’s manual, the maker’s
          specification page, the print on the shock, an old invoice. Sizes are written as two numbers,
          eye-to-eye first, then <TextLink to="/help/stroke-is-not-travel">stroke</TextLink>. The first is
          always the greater one, so a swapped pair does no harm. Older sizes are printed in inches:{' '}
          <b>7.875 x 2.25</b> is the shock that others call <b>200x57</b>.
        </p>
        <h2>How to measure it</h2>
        <ol>
          <li>
            The shock must be fully extended. Leave the air in: an emptied air shock is pulled short by its
            own negative spring.
          </li>
          <li>Hold a caliper against the centres of the two holes, along the axis of the shock.</li>
          <li>
            Many calipers stop at 150 mm. Use a 300 mm one, or measure from the left edge of one hole to the
            left edge of the other: with equal holes that is the same distance.
          </li>
          <li>No edge to hold on to? Measure outside to outside and take off half of each eye’s diameter.</li>
        </ol>
      </Prose>
      <DrawingSheet caption="Both ways give 210 mm: edge to edge, or outside to outside less half of each eye.">
        <SameEdgeDrawing />
      </DrawingSheet>
      <Prose>
        <h2>Eyes that point different ways</h2>
        <p>
          Take the shock off the bike, then measure. Which way an eye points never matters for the fit: the
          shaft turns in the body.
        </p>
        <h2>On a trunnion shock</h2>
        <p>
          There is no eye at the body end. Measure from the axis of the two trunnion bolts to the centre of
          the eye at the other end. <TextLink to="/help/trunnion">More about trunnions.</TextLink>
        </p>
        <h2>How good is a reading?</h2>
        <p>
          As a rule of the trade, two readings in three lie within these limits. In the frame, or across eyes
          that are turned, count on somewhat more.
        </p>
        <FigureTable>
          <caption>What a tool can tell</caption>
          <thead>
            <tr>
              <th scope="col">Tool</th>
              <th scope="col" className="figure">
                Within, mm
              </th>
              <th scope="col" className="figure">
                In the frame, mm
              </th>
            </tr>
          </thead>
          <tbody>
            <tr>
              <th scope="row">Caliper</th>
              <td className="figure">0.25</td>
              <td className="figure">0.6</td>
            </tr>
            <tr>
              <th scope="row">Steel ruler</th>
              <td className="figure">0.7</td>
              <td className="figure">0.9</td>
            </tr>
            <tr>
              <th scope="row">Tape measure</th>
              <td className="figure">1.2</td>
              <td className="figure">1.3</td>
            </tr>
          </tbody>
        </FigureTable>
        <p>
          A tape tells 210 mm from 230 mm. It does not tell 197 mm from 200 mm, and both are on sale. The
          measure-up works out what your readings can mean, and says so when they are not enough.
        </p>
      </Prose>
    </HelpPage>
  );
}
