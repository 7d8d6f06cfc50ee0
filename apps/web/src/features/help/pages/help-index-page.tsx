import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import type { DimensionKey } from '../../../components/drawing/dimensions';
import { HardwareDrawing } from '../../../components/drawing/hardware-drawing';
import type { Box } from '../../../components/drawing/shapes';
import { commonSheet, sheetFor } from '../../../components/drawing/sheet';
import { ShockDrawing } from '../../../components/drawing/shock-drawing';
import type { ShockFigure } from '../../../components/drawing/shock-figure';
import { Page } from '../../../components/page';
import { PageHeading } from '../../../components/page-heading';
import { TextLink } from '../../../components/text-link';
import { coil, inlineAir, trunnion, withRemote, withReservoir } from '../figures/example-shocks';
import { RearEndDrawing } from '../figures/rear-end-drawing';
import { topics, type TopicPath } from '../topics';

const { x1, x2 } = commonSheet([inlineAir, coil, trunnion, withReservoir], ['eye-to-eye']);

/** As wide as all others, so that the scale is one, and as high as it needs to be. */
const sheetOf = (figure: ShockFigure, keys: readonly DimensionKey[] = []): Box => ({
  ...sheetFor(figure, keys),
  x1,
  x2,
});

const drawings: Record<TopicPath, ReactNode> = {
  '/help/eye-to-eye': (
    <ShockDrawing
      figure={inlineAir}
      dimensions={['eye-to-eye']}
      asked="eye-to-eye"
      sheet={sheetOf(inlineAir, ['eye-to-eye'])}
    />
  ),
  '/help/stroke-is-not-travel': <RearEndDrawing wheelMm={70} />,
  '/help/trunnion': <ShockDrawing figure={trunnion} behind={inlineAir} sheet={sheetOf(trunnion)} />,
  '/help/hardware': <HardwareDrawing figure={{ widthMm: 30, boltMm: 8, boreMm: 15 }} dimensions={[]} />,
  '/help/air-or-coil': <ShockDrawing figure={coil} behind={inlineAir} sheet={sheetOf(coil)} />,
  '/help/reservoir': <ShockDrawing figure={withReservoir} sheet={sheetOf(withReservoir)} />,
  '/help/remote': <ShockDrawing figure={withRemote} sheet={sheetOf(withRemote)} />,
};

const Row = chakra(Link, {
  base: {
    display: 'grid',
    gridTemplateColumns: { base: 'minmax(0, 1fr)', sm: '15rem minmax(0, 1fr)', md: '18rem minmax(0, 1fr)' },
    columnGap: { sm: '6', md: '12' },
    rowGap: '3',
    alignItems: 'center',
    paddingBlock: '4',
    borderTopWidth: '1px',
    borderColor: 'hair',
    color: 'ink',
    '& h2': { textDecorationLine: 'underline', textDecorationColor: 'var(--lf-colors-rule)' },
    _hover: { '& h2': { textDecorationColor: 'var(--lf-colors-bracken)' } },
  },
});

export function HelpIndexPage() {
  return (
    <Page>
      <PageHeading lead="The words of the trade that a measure-up needs, each with a drawing, how to measure it, and what to beware of.">
        Help
      </PageHeading>
      <chakra.ul listStyleType="none" borderBottomWidth="1px" borderColor="hair">
        {topics.map(({ path, title, summary }) => (
          <li key={path}>
            <Row to={path}>
              <chakra.div aria-hidden="true" css={{ '--drawing-ground': 'var(--lf-colors-chalk)' }}>
                {drawings[path]}
              </chakra.div>
              <div>
                <chakra.h2
                  fontSize="xl"
                  fontWeight="heavy"
                  lineHeight="heading"
                  textUnderlineOffset="0.2em"
                  textDecorationThickness="1px"
                >
                  {title}
                </chakra.h2>
                <chakra.p color="slate" marginTop="1" maxWidth="30rem">
                  {summary}
                </chakra.p>
              </div>
            </Row>
          </li>
        ))}
      </chakra.ul>
      <chakra.p marginTop="8" maxWidth="line">
        Something else? <TextLink to="/contact">Write to us</TextLink>, or ask{' '}
        <TextLink to="/workshops">a workshop near you</TextLink>. Suspension work can injure: if you are
        unsure, have a qualified mechanic do it.
      </chakra.p>
    </Page>
  );
}
