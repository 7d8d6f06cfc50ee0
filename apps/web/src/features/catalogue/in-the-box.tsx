import type { ShockPage } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { TextLink } from '../../components/text-link';

const List = chakra('ul', {
  base: {
    listStyleType: 'none',
    borderBottomWidth: '1px',
    borderColor: 'hair',
    '& li': { paddingBlock: '2', borderTopWidth: '1px', borderColor: 'hair', lineHeight: 'heading' },
  },
});
const Title = chakra('h3', { base: { fontWeight: 'bold', marginBottom: '2' } });

export const warrantyWords = (months: number | null): string => {
  if (months === null) return 'The maker states no warranty beyond what the law gives you.';
  const years = months / 12;
  const span = Number.isInteger(years) ? (years === 1 ? '1 year' : `${years} years`) : `${months} months`;
  return `The maker’s warranty is ${span}; what the law gives you stands beside it.`;
};

/** What comes with it, what does not, and what the maker promises. */
export function InTheBox({ page }: { page: ShockPage }) {
  return (
    <>
      <chakra.div
        display="grid"
        gridTemplateColumns={{ base: '1fr', md: '1fr 1fr' }}
        columnGap="12"
        rowGap="6"
      >
        <div>
          <Title>In it</Title>
          {page.inTheBox.length === 0 ? (
            <p>The maker does not say what is packed with it.</p>
          ) : (
            <List>
              {page.inTheBox.map((line) => (
                <li key={line}>{line}</li>
              ))}
            </List>
          )}
        </div>
        <div>
          <Title>Sold apart</Title>
          {page.notInTheBox.length === 0 ? (
            <p>Nothing that we know of.</p>
          ) : (
            <List>
              {page.notInTheBox.map((line) => (
                <li key={line}>{line}</li>
              ))}
            </List>
          )}
        </div>
      </chakra.div>
      <chakra.p marginTop="4" maxWidth="line">
        {warrantyWords(page.warrantyMonths)} See also <TextLink to="/returns">returns and refunds</TextLink>.
      </chakra.p>
    </>
  );
}
