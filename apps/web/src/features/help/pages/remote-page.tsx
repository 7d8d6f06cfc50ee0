import { ShockDrawing } from '../../../components/drawing/shock-drawing';
import { asPrinted, askMechanic, stopRiding } from '../cautions';
import { DrawingSheet } from '../../../components/drawing-sheet';
import { withRemote } from '../figures/example-shocks';
import { HelpPage } from '../help-page';
import { FigureTable, Prose } from '../prose';

export function RemotePage() {
  return (
    <HelpPage
      path="/help/remote"
      lead="A lever at the bar firms the shock through a cable or a hydraulic line, so that it moves less on a climb. You open it again for the way down."
      cautions={[
        'A cable that is too short pulls when the suspension moves. Check it through the whole travel before riding.',
        asPrinted,
        askMechanic,
        stopRiding,
      ]}
    >
      <DrawingSheet caption="A shock worked from the bar: the cable turns the drum on the body. Others have a small lever there for your hand.">
        <ShockDrawing figure={withRemote} title="An air shock with the cable drum of a remote" />
      </DrawingSheet>
      <Prose>
        <h2>Two kinds that must not be mixed</h2>
        <p>
          What does a pull do? Lever and shock must agree. Look at what the shock does when nobody pulls: that
          is also what it does when the cable breaks, or when you ride without one.
        </p>
        <FigureTable>
          <caption>What a pull means</caption>
          <thead>
            <tr>
              <td />
              <th scope="col">Pull to lock</th>
              <th scope="col">Pull to open</th>
            </tr>
          </thead>
          <tbody>
            <tr>
              <th scope="row">Lever pulled</th>
              <td>firm</td>
              <td>open</td>
            </tr>
            <tr>
              <th scope="row">Lever let go</th>
              <td>open</td>
              <td>firm</td>
            </tr>
            <tr>
              <th scope="row">Without a cable</th>
              <td>stays open: can be ridden</td>
              <td>stays firm: needs a part of its maker that holds it open</td>
            </tr>
          </tbody>
        </FigureTable>
        <h2>Keeping your lever</h2>
        <p>
          Your old lever works with a new shock only if both the meaning of a pull and the kind of line, cable
          or hydraulic, are the same. If not, the fitting sheet counts a new lever as a part, with its price.
        </p>
        <h2>Getting rid of it</h2>
        <p>
          Choose a shock with a lever for your hand, or one that is pulled to lock. The empty lever comes off
          the bar; the hole in the frame gets its plug.
        </p>
        <h2>Where does the line go?</h2>
        <p>
          The frame sheet says whether there is a way inside the frame. If there is none, the line can run
          outside, if you accept that; fitting it is work that a workshop prices. If nobody knows, we ask.
        </p>
      </Prose>
    </HelpPage>
  );
}
