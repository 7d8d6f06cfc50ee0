import { chakra } from '@chakra-ui/react';

const facts = [
  {
    title: 'What we check',
    text: 'Eye-to-eye, stroke, both mounts, hardware, spring for your weight, room in the frame and the remote. Each figure is shown with where it came from.',
  },
  {
    title: 'What we refuse to guess',
    text: 'A dimension nobody has measured is “not known”, and the shock “needs an answer first”. There is no “close enough”.',
  },
  {
    title: 'Who fits it',
    text: 'A workshop you choose, at a time it has free. Nothing is sent until it has accepted; if it declines, you choose again or get all your money back.',
  },
];

/** Three reasons to trust a verdict. */
export function TrustFacts() {
  return (
    <chakra.section
      aria-label="Why you can rely on it"
      display="grid"
      gridTemplateColumns={{ base: '1fr', md: 'repeat(3, 1fr)' }}
      columnGap="10"
      rowGap="5"
      marginTop={{ base: '8', md: '10' }}
    >
      {facts.map(({ title, text }) => (
        <chakra.div key={title} borderTopWidth="2px" borderColor="ink" paddingTop="3">
          <chakra.h2 fontSize="lg" fontWeight="bold" lineHeight="heading">
            {title}
          </chakra.h2>
          <chakra.p marginTop="1" color="slate">
            {text}
          </chakra.p>
        </chakra.div>
      ))}
    </chakra.section>
  );
}
