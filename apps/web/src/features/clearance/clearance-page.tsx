import type { ClearanceView } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { useParams, useSearchParams } from 'react-router-dom';
import { DrawingSheet } from '../../components/drawing-sheet';
import { ChoiceGroup } from '../../components/forms/choice-group';
import { LoadFailed } from '../../components/load-failed';
import { Notice } from '../../components/notice';
import { Page } from '../../components/page';
import { PageHeading } from '../../components/page-heading';
import { Skeleton } from '../../components/skeleton';
import { TextLink } from '../../components/text-link';
import { formatFigure } from '../../lib/format-figure';
import { usePageTitle } from '../../lib/page-title';
import { clearanceQuery } from './api';
import { SweepDrawing, tellSweep, type SweptPosition } from './sweep-drawing';

/** The reservoir's way through the frame, as the check judges it. */
export function ClearancePage() {
  const { id = '', sizeId = '' } = useParams();
  const { data: view, error } = useQuery(clearanceQuery(id, sizeId));
  usePageTitle(view ? `Room: ${view.shockName}` : 'Room in the frame');
  const back = `/measure-up/${id}/matches/${sizeId}`;
  if (error) {
    return <LoadFailed error={error} what="this drawing" next={{ to: back, label: 'Back to this shock' }} />;
  }
  if (!view) {
    return (
      <Page>
        <PageHeading>Room in the frame</PageHeading>
        <Skeleton lines={8} what="Moving the shock through its stroke" />
      </Page>
    );
  }
  return (
    <Page>
      <chakra.p marginBottom="2">
        <TextLink to={back} display="inline-flex" alignItems="center" minHeight="target">
          Back to all checks
        </TextLink>
      </chakra.p>
      <PageHeading above={`Room in the ${view.frameName}`} lead={view.say}>
        {view.shockName}
      </PageHeading>
      {view.why ? (
        <chakra.div maxWidth="form">
          <Notice title="Nothing is drawn here">
            <p>{view.why}</p>
          </Notice>
        </chakra.div>
      ) : (
        <Sweep view={view} />
      )}
    </Page>
  );
}

/** A position as somebody beside the bike would say it. */
const turnedWord = ({ deg, refused }: SweptPosition): string =>
  `${({ 0: 'Up', 90: 'To the drive side', 180: 'Down', 270: 'Away from the drive side' } as Record<number, string>)[deg] ?? 'Turned'}, ${deg}°${refused ? ' (refused by the frame’s maker)' : ''}`;

function Sweep({ view }: { view: ClearanceView }) {
  const [search, setSearch] = useSearchParams();
  const asked = search.get('turned') ?? String(view.chosenDeg);
  const position = view.positions.find(({ deg }) => String(deg) === asked) ?? view.positions[0];
  if (!position) return null;
  return (
    <>
      {view.positions.length > 1 ? (
        <ChoiceGroup
          id="turned"
          name="turned"
          legend="The reservoir turned"
          layout="row"
          value={String(position.deg)}
          onChange={(turned) => setSearch({ turned }, { replace: true })}
          choices={view.positions.map((one) => ({
            value: String(one.deg),
            label: turnedWord(one),
            hint: one.distanceMm > 0 ? `${formatFigure(one.distanceMm, 1)} mm free` : 'touches',
          }))}
        />
      ) : null}
      <DrawingSheet
        caption={`Seen from the drive side, to scale. Full lines where it is tightest, thin lines elsewhere in the stroke. ${view.wayRound === 'body-to-frame' ? 'The body faces the frame.' : 'The body faces the link.'}`}
        block={[
          { label: 'Stays free', text: `${formatFigure(position.distanceMm, 1)} mm` },
          { label: 'At', text: `${formatFigure(position.atShockMm, 1)} mm` },
          { label: 'Must stay free', text: '3 mm' },
        ]}
      >
        <SweepDrawing view={view} position={position} />
      </DrawingSheet>
      <chakra.div maxWidth="line">
        <p>{tellSweep(view, position)}</p>
        {position.incomplete ? (
          <p>
            The drawings have a gap ({position.incomplete}), so this distance does not speak for everything.
          </p>
        ) : null}
        <chakra.p color="slate" marginTop="3">
          The figure is what can be vouched for over the whole stroke, less the tolerance of the drawings and
          rounded down. 3 mm must stay free, 5 mm is comfortable (common practice).
        </chakra.p>
      </chakra.div>
    </>
  );
}
