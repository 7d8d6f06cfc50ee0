import { HardwareDrawing } from '../../../components/drawing/hardware-drawing';
import { MountDrawing } from '../../../components/drawing/mount-drawing';
import { TextLink } from '../../../components/text-link';
import { asPrinted, askMechanic, stopRiding } from '../cautions';
import { DrawingSheet } from '../../../components/drawing-sheet';
import { HelpPage } from '../help-page';
import { Prose } from '../prose';

export function HardwarePage() {
  return (
    <HelpPage
      path="/help/hardware"
      lead="The small parts between an eye of the shock and the frame: a bush in the eye, a sleeve or pin through it, and spacers out to the frame’s width."
      cautions={[
        asPrinted,
        'Bushes are pressed in and out with a press tool, never with a hammer: a bent eye fails while riding.',
        'Do not grease a dry-lined bush, and grease nothing that calls for thread-lock.',
        askMechanic,
        stopRiding,
      ]}
    >
      <DrawingSheet
        caption="A kit 30 × 8 for a 15 mm eye, taken apart and cut along its bolt."
        block={[
          { label: 'Width', text: '30 mm' },
          { label: 'Bolt', text: '8 mm' },
          { label: 'Written', text: '30x8' },
        ]}
      >
        <HardwareDrawing figure={{ widthMm: 30, boltMm: 8, boreMm: 15 }} asked="width" />
      </DrawingSheet>
      <Prose>
        <h2>Width x bolt</h2>
        <p>
          Hardware is named by two figures: how wide it is across, and the bolt it is for. <b>24x8</b> is 24
          mm across, for an 8 mm bolt. Widths run from 19 to 70 mm, bolts are 6, 8 or 10 mm, seldom 12. The
          two ends of one shock often need different kits.
        </p>
        <h2>Where to find it, and how to measure it</h2>
        <ol>
          <li>The frame’s manual or specification page lists it, for each end.</li>
          <li>
            Otherwise measure between the frame’s two cheeks, or across the hardware that is in it now,
            outside to outside.
          </li>
          <li>
            Measure the bare part of the bolt, not its thread. A caliper tells 8 mm from 10 mm; a tape does
            not.
          </li>
          <li>Measure the bore of the eye too. It is nearly always 15 mm; nearly.</li>
        </ol>
      </Prose>
      <DrawingSheet caption="The same kit in place, between the frame’s cheeks.">
        <MountDrawing
          figure={{ kind: 'hardware', widthMm: 30, boltMm: 8, boreMm: 15 }}
          dimensions={['width', 'bolt', 'bore']}
          asked="width"
        />
      </DrawingSheet>
      <Prose>
        <h2>A new shock has none</h2>
        <p>
          Hardware is sold apart, because it belongs to the frame. Your old kit can move across if it has the
          right size and bore and no play or damage; a workshop inspects it and presses it in. A worn bush
          knocks.
        </p>
        <h2>Frames that need none</h2>
        <ul>
          <li>
            <b>Pin:</b> the frame’s own pin goes straight into the eye. Bore and pin must be equal; no kit
            helps.
          </li>
          <li>
            <b>Bearing eye:</b> the shock’s eye holds a bearing for one bolt and one width. Both must equal
            the frame’s.
          </li>
          <li>
            <b>Trunnion:</b> two bolts of the frame go into the body.{' '}
            <TextLink to="/help/trunnion">What is a trunnion?</TextLink>
          </li>
        </ul>
        <p>
          Offset bushes shift the eye and so change the bike’s geometry. We refuse them unless the frame’s
          maker lists them.
        </p>
      </Prose>
    </HelpPage>
  );
}
