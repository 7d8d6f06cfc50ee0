import type { ShockPage as ShockView } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import type { DimensionKey } from '../../components/drawing/dimensions';
import { ShockDrawing } from '../../components/drawing/shock-drawing';
import { DrawingSheet } from '../../components/drawing-sheet';
import { LinkButton } from '../../components/link-button';
import { LoadFailed } from '../../components/load-failed';
import { Notice } from '../../components/notice';
import { Page } from '../../components/page';
import { PageHeading } from '../../components/page-heading';
import { Part } from '../../components/part';
import { DrawingSkeleton, Skeleton } from '../../components/skeleton';
import { SpecTable } from '../../components/spec-table';
import { TextLink } from '../../components/text-link';
import { formatDay } from '../../lib/format-date';
import { formatSize, formatWithUnit } from '../../lib/format-figure';
import { formatMoney } from '../../lib/format-money';
import { usePageTitle } from '../../lib/page-title';
import { topics } from '../help/topics';
import { shockQuery } from './api';
import { InTheBox } from './in-the-box';
import { NotChecked } from './not-checked';
import { OfferTable } from './offer-table';
import { OtherSizes } from './other-sizes';

const ends: readonly DimensionKey[] = ['eye-to-eye', 'stroke', 'body-bore', 'shaft-bore', 'reservoir-length'];

/** Across a coil its turns hide the figure, and the shaft's other position with it: the table has them. */
const dimensionsOf = (spring: ShockView['spring']): readonly DimensionKey[] =>
  spring === 'air' ? [...ends, 'diameter'] : ends;

const sizeWords = (sizeKey: string): string => {
  const [eyeToEye, stroke] = sizeKey.split('x').map(Number);
  return formatSize(eyeToEye ?? 0, stroke ?? null);
};

const sourceWords = ({ label, date }: ShockView['source']): string =>
  date ? `${label}, ${formatDay(date)}` : label;

/** One shock size: drawing, data sheet, box, warranty, and who has it. */
export function ShockPage() {
  const { sizeId = '' } = useParams();
  const { data: page, error } = useQuery(shockQuery(sizeId));
  const name = page ? `${page.makerName} ${page.modelName}` : 'One shock';
  usePageTitle(page ? `${name} ${sizeWords(page.sizeKey)}` : name);
  if (error) {
    return (
      <LoadFailed
        error={error}
        what="this shock"
        gone="No shock of the catalogue has this address. It may have been taken off."
        next={{ to: '/shocks', label: 'Look at all sizes' }}
      />
    );
  }
  if (!page) {
    return (
      <Page>
        <PageHeading>One shock</PageHeading>
        <DrawingSkeleton />
        <Skeleton lines={6} what="Loading the shock" />
      </Page>
    );
  }
  const above = (
    <TextLink
      to={`/shocks/sizes/${page.sizeKey}`}
      display="inline-flex"
      alignItems="center"
      minHeight="target"
    >
      Shocks of {sizeWords(page.sizeKey)} mm
    </TextLink>
  );
  return (
    <Page>
      <PageHeading above={above} lead={page.summary}>
        {name} {sizeWords(page.sizeKey)}
      </PageHeading>
      {page.notices.map(({ title, effect, source }) => (
        <chakra.div key={title} marginBottom="4">
          <Notice
            tone={effect === 'stop' ? 'brick' : 'gorse'}
            title={effect === 'stop' ? 'The maker has stopped it' : 'A notice of the maker'}
          >
            <p>
              {title} ({sourceWords(source)})
            </p>
          </Notice>
        </chakra.div>
      ))}
      <Top page={page} />
      <Part
        title="Who has it"
        note="One shock, VAT included, cheapest with carriage first. Parts and fitting come on top: the measure-up tells which, and the plan adds them up."
      >
        {page.offers.length > 0 ? (
          <OfferTable offers={page.offers} />
        ) : (
          <Notice title="No shop has one now">
            <p>
              Every unit is sold or promised to somebody. Other shocks of{' '}
              <TextLink to={`/shocks/sizes/${page.sizeKey}`}>{sizeWords(page.sizeKey)} mm</TextLink> may be
              free.
            </p>
          </Notice>
        )}
      </Part>
      <Part title="Specification" note={`From: ${sourceWords(page.source)}.`}>
        <Specification page={page} />
        <Words page={page} />
      </Part>
      <Part title="In the box">
        <InTheBox page={page} />
      </Part>
      {page.otherSizes.length > 0 ? (
        <Part
          title={`The ${page.modelName} in other sizes`}
          note="The same name, another length or stroke: none of them fits in place of another."
        >
          <OtherSizes page={page} />
        </Part>
      ) : null}
    </Page>
  );
}

function Top({ page }: { page: ShockView }) {
  const { drawing } = page;
  return (
    <chakra.div
      display="grid"
      gridTemplateColumns={{ base: 'minmax(0, 1fr)', lg: 'minmax(0, 1fr) 20rem' }}
      columnGap="12"
      rowGap="6"
      alignItems="start"
      css={{ '& > figure': { marginBlock: 0 } }}
    >
      <DrawingSheet
        caption={
          drawing.spring === 'air'
            ? 'Drawn to scale from its data sheet; dashed, where the shaft end comes to at full stroke.'
            : 'Drawn to scale from its data sheet, with a spring of usual length.'
        }
        block={[
          { label: 'Eye-to-eye', text: formatWithUnit(drawing.eyeToEyeMm, 'mm', 1) },
          ...(drawing.strokeMm === null
            ? []
            : [{ label: 'Stroke', text: formatWithUnit(drawing.strokeMm, 'mm', 1) }]),
          { label: 'Mass', text: formatWithUnit(page.massG, 'g') },
        ]}
      >
        <ShockDrawing
          figure={drawing}
          dimensions={dimensionsOf(drawing.spring)}
          asked="eye-to-eye"
          ghost={drawing.spring === 'air'}
        />
      </DrawingSheet>
      <chakra.div display="grid" gap="5">
        <p>
          <chakra.span display="block" fontSize="2xl" fontWeight="heavy" lineHeight="heading">
            {page.fromMinor === null ? 'Sold out' : `From ${formatMoney(page.fromMinor)}`}
          </chakra.span>
          <chakra.span color="slate">
            {page.fromMinor === null
              ? 'no shop has one now'
              : `VAT included, ${page.shops === 1 ? 'at 1 shop' : `at ${page.shops} shops`}; without parts and fitting`}
          </chakra.span>
        </p>
        <NotChecked />
        <LinkButton to="/measure-up">Check it for my bike</LinkButton>
      </chakra.div>
    </chakra.div>
  );
}

function Specification({ page }: { page: ShockView }) {
  return (
    <chakra.div
      display="grid"
      gridTemplateColumns={{ base: 'minmax(0, 1fr)', md: 'repeat(2, minmax(0, 1fr))' }}
      columnGap="12"
      rowGap="8"
      alignItems="start"
    >
      {page.groups.map(({ title, figures }) => (
        <SpecTable
          key={title}
          caption={title}
          rows={figures.map(({ label, value, unit, source }) => ({
            label,
            value,
            ...(unit ? { unit } : {}),
            // Where a figure has no source of its own, the sheet's stands above.
            ...(source && source.label !== page.source.label ? { source: sourceWords(source) } : {}),
          }))}
        />
      ))}
    </chakra.div>
  );
}

/** The words of the table that have a page of their own. */
function Words({ page }: { page: ShockView }) {
  const { drawing } = page;
  const ends = [drawing.bodyEnd.kind, drawing.shaftEnd.kind];
  const words = topics.filter(({ path }) => {
    if (path === '/help/trunnion') return ends.includes('trunnion');
    if (path === '/help/hardware') return ends.includes('eyelet');
    if (path === '/help/reservoir') return page.reservoir;
    if (path === '/help/remote') return page.remote !== null;
    return true;
  });
  return (
    <chakra.nav aria-label="Words explained" marginTop="4">
      <chakra.ul listStyleType="none" display="flex" flexWrap="wrap" columnGap="6">
        {words.map(({ path, title }) => (
          <li key={path}>
            <TextLink to={path} display="inline-flex" alignItems="center" minHeight="target">
              {title}
            </TextLink>
          </li>
        ))}
      </chakra.ul>
    </chakra.nav>
  );
}
