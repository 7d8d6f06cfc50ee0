import type { CurvesView, RideView } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { useParams, useSearchParams } from 'react-router-dom';
import { Field } from '../../components/forms/field';
import { Select } from '../../components/forms/select';
import { LoadFailed } from '../../components/load-failed';
import { Notice } from '../../components/notice';
import { Page } from '../../components/page';
import { PageHeading } from '../../components/page-heading';
import { Skeleton } from '../../components/skeleton';
import { TextLink } from '../../components/text-link';
import { formatFigure } from '../../lib/format-figure';
import { usePageTitle } from '../../lib/page-title';
import { curvesQueryOptions } from './api';
import { FiguresTable } from './figures-table';
import { LineChart } from './line-chart';
import { linesOf, quantities, tableOf, tellQuantity, type Quantity } from './quantities';

/** Present and new shock in one picture: force and rate at the wheel, and the frame's leverage. */
export function CurvesPage() {
  const { id = '', sizeId = '' } = useParams();
  const [search, setSearch] = useSearchParams();
  const { data: view, error } = useQuery(curvesQueryOptions(id, sizeId, search.get('present')));
  usePageTitle(view ? `Curves: ${view.shockName}` : 'Curves');
  const back = `/measure-up/${id}/matches/${sizeId}`;
  if (error) {
    return <LoadFailed error={error} what="these curves" next={{ to: back, label: 'Back to this shock' }} />;
  }
  if (!view) {
    return (
      <Page>
        <PageHeading>Curves</PageHeading>
        <Skeleton lines={8} what="Working out the curves" />
      </Page>
    );
  }
  const shown = quantities.filter((quantity) => linesOf(view, quantity).length > 0);
  return (
    <Page>
      <chakra.p marginBottom="2">
        <TextLink to={back} display="inline-flex" alignItems="center" minHeight="target">
          Back to all checks
        </TextLink>
      </chakra.p>
      <PageHeading
        above={`Curves in the ${view.frameName}`}
        lead="Worked out for you as you sit on this bike. Figures to compare two shocks by, not promises of how they ride."
      >
        {view.shockName}
      </PageHeading>
      {view.choices.length > 0 ? (
        <chakra.div maxWidth="form">
          <Field
            id="present"
            label="Which shock is on the bike now?"
            hint="With its model known, its own spring can be drawn beside the new one."
          >
            {(control) => (
              <Select
                {...control}
                value={view.chosen ?? ''}
                onChange={({ target }) =>
                  setSearch(target.value ? { present: target.value } : {}, { replace: true })
                }
              >
                <option value="">Not in this list</option>
                {view.choices.map(({ sizeId: key, name }) => (
                  <option key={key} value={key}>
                    {name}
                  </option>
                ))}
              </Select>
            )}
          </Field>
        </chakra.div>
      ) : null}
      {view.notDrawn.length > 0 ? (
        <chakra.div marginBottom="8" maxWidth="form">
          <Notice tone="heather" title="What is not drawn" announce="status">
            {view.notDrawn.map((line) => (
              <p key={line}>{line}</p>
            ))}
          </Notice>
        </chakra.div>
      ) : null}
      {shown.length > 0 ? <SideBySide view={view} /> : null}
      {shown.map((quantity) => (
        <QuantitySection key={quantity.key} view={view} quantity={quantity} />
      ))}
      <chakra.section maxWidth="line" borderTopWidth="2px" borderColor="ink" paddingTop="4">
        <chakra.h2 fontSize="xl" fontWeight="heavy" marginBottom="2">
          What this rests on
        </chakra.h2>
        <chakra.ul paddingLeft="5" listStyleType="disc">
          {view.assumed.map((line) => (
            <li key={line}>{line}</li>
          ))}
        </chakra.ul>
      </chakra.section>
    </Page>
  );
}

function SideBySide({ view }: { view: CurvesView }) {
  const sides = [view.next, view.present].filter((side) => side !== null);
  const row = (name: string, figure: (ride: RideView) => string): string[] => [name, ...sides.map(figure)];
  const ofSpring =
    (figure: (spring: NonNullable<RideView['spring']>) => string) =>
    ({ spring }: RideView): string =>
      spring ? figure(spring) : 'not drawn';
  return (
    <chakra.section marginBottom="10" maxWidth="form">
      <FiguresTable
        caption="Side by side"
        heads={['Figure', ...sides.map(({ name }) => name)]}
        rows={[
          row('Travel, mm', ({ travelMm }) => formatFigure(travelMm, 0)),
          row('Mean leverage', ({ meanRatio }) => formatFigure(meanRatio, 2)),
          row('Progression, %', ({ progressionPercent }) =>
            progressionPercent === null ? 'not known' : formatFigure(progressionPercent, 0),
          ),
          row(
            'Spring',
            ofSpring(({ text }) => text),
          ),
          row(
            'Sag at the wheel, mm',
            ofSpring(({ sagWheelMm }) => formatFigure(sagWheelMm, 0)),
          ),
          row(
            'Frequency at sag, Hz',
            ofSpring(({ frequencyHz }) => formatFigure(frequencyHz, 2)),
          ),
          row(
            'Force at the end, times the load',
            ofSpring(({ endToStatic }) => formatFigure(endToStatic, 1)),
          ),
          row(
            'Energy from sag to the end, J',
            ofSpring(({ energyJ }) => formatFigure(energyJ, 0)),
          ),
        ]}
      />
    </chakra.section>
  );
}

function QuantitySection({ view, quantity }: { view: CurvesView; quantity: Quantity }) {
  const told = tellQuantity(view, quantity);
  const { heads, rows } = tableOf(view, quantity);
  return (
    <chakra.section marginBottom="10" borderTopWidth="2px" borderColor="ink" paddingTop="4">
      <chakra.h2 fontSize="xl" fontWeight="heavy" marginBottom="1">
        {quantity.title}
      </chakra.h2>
      <chakra.p color="slate" maxWidth="line" marginBottom="4">
        {quantity.lead}
      </chakra.p>
      <chakra.div
        display="grid"
        gridTemplateColumns={{ base: 'minmax(0, 1fr)', lg: 'minmax(0, 38rem) minmax(0, 1fr)' }}
        gap={{ base: '6', lg: '10' }}
        alignItems="start"
      >
        <chakra.figure margin="0">
          <LineChart
            title={`${quantity.title} against wheel travel`}
            description={told}
            yLabel={quantity.yLabel}
            lines={linesOf(view, quantity)}
            fromZero={quantity.fromZero}
            decimals={quantity.decimals}
            level={
              quantity.key === 'forceN' && view.loadN !== null
                ? { at: view.loadN, label: `you: ${formatFigure(view.loadN, 0)} N` }
                : null
            }
          />
          <chakra.figcaption color="slate" fontSize="sm" marginTop="2" maxWidth="line">
            {told}
          </chakra.figcaption>
        </chakra.figure>
        <FiguresTable
          caption={`${quantity.title}${quantity.unit && `, ${quantity.unit}`}`}
          heads={heads}
          rows={rows}
        />
      </chakra.div>
    </chakra.section>
  );
}
