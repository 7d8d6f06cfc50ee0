import type { ShockRow } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { useMemo } from 'react';
import { Link } from 'react-router-dom';
import { commonSheet, sheetFor } from '../../components/drawing/sheet';
import { ShockDrawing } from '../../components/drawing/shock-drawing';
import { formatSize, formatWithUnit } from '../../lib/format-figure';
import { formatMoney } from '../../lib/format-money';

const columns = {
  base: 'minmax(0, 1fr) auto',
  md: '15rem minmax(0, 1fr) 6rem',
  lg: '17rem 13rem minmax(0, 1fr) 6rem 8rem',
};

const Row = chakra('li', {
  base: {
    display: 'grid',
    gridTemplateColumns: columns,
    columnGap: '6',
    rowGap: '2',
    alignItems: 'center',
    paddingBlock: '4',
    borderTopWidth: '1px',
    borderColor: 'hair',
    lineHeight: 'heading',
    fontVariantNumeric: 'tabular-nums',
    '--drawing-ground': 'var(--lf-colors-chalk)',
  },
});

const Name = chakra(Link, {
  base: {
    display: 'inline-flex',
    alignItems: 'center',
    minHeight: 'target',
    fontWeight: 'heavy',
    fontSize: 'lg',
    color: 'ink',
    textDecoration: 'underline',
    textDecorationColor: 'rule',
    textDecorationThickness: '1px',
    textUnderlineOffset: '0.2em',
    _hover: { textDecorationColor: 'bracken' },
  },
});

const mountsInShort = ({ bodyEnd, shaftEnd }: ShockRow): string =>
  bodyEnd === shaftEnd ? `Both ends ${bodyEnd}` : `Body ${bodyEnd}; shaft ${shaftEnd}`;

const leverWords = {
  'pull-to-lock': 'remote, pull to lock',
  'pull-to-open': 'remote, pull to open',
} as const;

/** Shocks drawn to one scale from one origin, each with what its data sheet says. */
export function ShockRows({ shocks }: { shocks: readonly ShockRow[] }) {
  const across = useMemo(() => {
    const { x1, x2 } = commonSheet(shocks.map(({ drawing }) => drawing));
    return { x1, x2 };
  }, [shocks]);
  return (
    <>
      <chakra.div
        display={{ base: 'none', lg: 'grid' }}
        gridTemplateColumns={columns}
        columnGap="6"
        color="slate"
        fontSize="sm"
        fontWeight="bold"
        paddingBottom="2"
        aria-hidden="true"
      >
        <span>All drawn to one scale</span>
        <span>Shock</span>
        <span>Mounts and lever</span>
        <chakra.span textAlign="right">Mass, g</chakra.span>
        <chakra.span textAlign="right">From, with VAT</chakra.span>
      </chakra.div>
      <chakra.ul
        listStyleType="none"
        borderBottomWidth="1px"
        borderColor="hair"
        borderTopWidth="2px"
        borderTopColor="ink"
      >
        {shocks.map((shock) => (
          <ShockLine key={shock.sizeId} shock={shock} across={across} />
        ))}
      </chakra.ul>
    </>
  );
}

function ShockLine({ shock, across }: { shock: ShockRow; across: { x1: number; x2: number } }) {
  const { drawing, bodyEnd, shaftEnd, reservoir, remote, massG, fromMinor, shops } = shock;
  const [eyeToEye, stroke] = shock.sizeKey.split('x').map(Number);
  return (
    <Row>
      <chakra.div gridColumn={{ base: '1 / -1', md: 'auto' }}>
        <ShockDrawing figure={drawing} sheet={{ ...sheetFor(drawing), ...across }} />
      </chakra.div>
      <div>
        <Name to={`/shocks/${shock.sizeId}`}>
          {shock.makerName} {shock.modelName}
        </Name>
        <chakra.p color="slate" fontSize="sm">
          {formatSize(eyeToEye ?? 0, stroke ?? null)} mm, {shock.spring}, {reservoir ? 'reservoir' : 'inline'}
          <chakra.span display={{ lg: 'none' }}>
            , {formatWithUnit(massG, 'g')}. {mountsInShort(shock)}
            {remote ? `, ${leverWords[remote]}` : ''}
          </chakra.span>
        </chakra.p>
      </div>
      <chakra.dl
        display={{ base: 'none', lg: 'block' }}
        fontSize="sm"
        css={{ '& div': { display: 'flex', gap: '2', paddingBlock: '1' } }}
      >
        <div>
          <chakra.dt color="slate">Body</chakra.dt>
          <dd>{bodyEnd}</dd>
        </div>
        <div>
          <chakra.dt color="slate">Shaft</chakra.dt>
          <dd>{shaftEnd}</dd>
        </div>
        <div>
          <chakra.dt color="slate">Lever</chakra.dt>
          <dd>{remote ? leverWords[remote] : 'by hand'}</dd>
        </div>
      </chakra.dl>
      <chakra.span display={{ base: 'none', lg: 'block' }} textAlign="right">
        {massG}
      </chakra.span>
      <chakra.p textAlign="right" whiteSpace="nowrap">
        <chakra.span fontWeight="heavy" fontSize="lg">
          {fromMinor === null ? '–' : formatMoney(fromMinor)}
        </chakra.span>
        <chakra.span display="block" color="slate" fontSize="sm">
          {shops === 0 ? 'no shop has it' : shops === 1 ? 'at 1 shop' : `at ${shops} shops`}
        </chakra.span>
      </chakra.p>
    </Row>
  );
}
