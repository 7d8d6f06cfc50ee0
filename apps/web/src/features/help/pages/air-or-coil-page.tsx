import { ShockDrawing } from '../../../components/drawing/shock-drawing';
import { commonSheet } from '../../../components/drawing/sheet';
import { TextLink } from '../../../components/text-link';
import { airOut, asPrinted, coilOff } from '../cautions';
import { DrawingSheet } from '../../../components/drawing-sheet';
import { coil, inlineAir } from '../figures/example-shocks';
import { SpringChart } from '../figures/spring-chart';
import { HelpPage } from '../help-page';
import { FigureTable, Prose } from '../prose';

const sheet = commonSheet([inlineAir, coil]);

const rows: readonly (readonly [string, string, string])[] = [
  ['Set for your weight', 'with a shock pump', 'by choosing the spring’s rate'],
  ['Force over the stroke', 'rises steeply at the end', 'rises in a straight line'],
  ['First touch', 'some seal friction', 'sensitive'],
  ['Mass', 'lighter', 'heavier'],
  ['Width in the frame', 'the can', 'the coil, often wider'],
  ['Costs extra', 'nothing', 'the spring'],
];

export function AirOrCoilPage() {
  return (
    <HelpPage
      path="/help/air-or-coil"
      lead="Both carry you. Air is light and set with a pump; a coil is sensitive and even, and its spring is chosen for your weight."
      cautions={[
        ...airOut,
        coilOff,
        'Fill only between the pressures that are printed on the shock, in steps, cycling it in between.',
        asPrinted,
      ]}
    >
      <DrawingSheet caption="An air shock and a coil shock of one size, 210 × 55, on one scale.">
        <ShockDrawing figure={inlineAir} sheet={sheet} />
        <ShockDrawing figure={coil} sheet={sheet} />
      </DrawingSheet>
      <Prose>
        <h2>The difference in one picture</h2>
        <p>
          Both springs below carry the same rider at the same sag. In the middle of the stroke the air spring
          gives a little more, towards the end it grows stiff; the coil stays as it is.
        </p>
      </Prose>
      <DrawingSheet caption="Slow force, worked out for an air spring of usual proportions at 203 psi and for the coil that gives the same sag, 599 lb/in with one turn of preload. An example, not a setting.">
        <SpringChart />
      </DrawingSheet>
      <Prose>
        <FigureTable>
          <caption>Side by side</caption>
          <thead>
            <tr>
              <td />
              <th scope="col">Air</th>
              <th scope="col">Coil</th>
            </tr>
          </thead>
          <tbody>
            {rows.map(([what, air, wound]) => (
              <tr key={what}>
                <th scope="row">{what}</th>
                <td>{air}</td>
                <td>{wound}</td>
              </tr>
            ))}
          </tbody>
        </FigureTable>
        <h2>Does your frame suit a coil?</h2>
        <ul>
          <li>
            What the frame’s maker says counts first. If the maker says nothing, a coil is “not known” with us
            until somebody asks.
          </li>
          <li>
            A coil does not stiffen by itself, so the frame should: its leverage should fall by 20 % or more
            over the stroke. From 10 to 20 % it may do, with advice; below that it tends to hit the end.
          </li>
          <li>
            On a yoke, the fork-shaped piece between shock and linkage, the shaft takes side load. A coil
            there needs the frame maker’s word.
          </li>
        </ul>
        <h2>Choosing the spring of a coil</h2>
        <p>
          Its rate follows from your weight, the bike’s leverage and the{' '}
          <TextLink to="/help/stroke-is-not-travel">sag</TextLink> you want. Springs come in steps of 25 or 50
          lb/in. One or two turns of preload hold it in place; more never mends a wrong rate. The fitting
          sheet names the nearest rates on sale and the sag that each gives.
        </p>
        <h2>Setting the pressure of air</h2>
        <p>
          Pressure follows from the same figures, and must lie between the least and the most that the shock’s
          maker prints. Very light and very heavy riders can fall outside; then we say so before you buy.
        </p>
      </Prose>
    </HelpPage>
  );
}
