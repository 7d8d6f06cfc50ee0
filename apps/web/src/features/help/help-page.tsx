import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { Cautions } from '../../components/cautions';
import { LinkButton } from '../../components/link-button';
import { Page } from '../../components/page';
import { PageHeading } from '../../components/page-heading';
import { TextLink } from '../../components/text-link';
import { topicOf, topics, type TopicPath } from './topics';

const Other = chakra(Link, {
  base: {
    display: 'flex',
    alignItems: 'center',
    minHeight: 'target',
    paddingBlock: '2',
    borderTopWidth: '1px',
    borderColor: 'hair',
    color: 'tarn',
    lineHeight: 'heading',
    _hover: { color: 'tarnDeep', textDecoration: 'underline', textUnderlineOffset: '0.2em' },
  },
});

export interface HelpPageProps {
  path: TopicPath;
  lead: ReactNode;
  children: ReactNode;
  /** Where the work can hurt. */
  cautions?: readonly string[];
}

/** One word of the trade explained: drawing and text, what to beware of, and the way on. */
export function HelpPage({ path, lead, children, cautions }: HelpPageProps) {
  const topic = topicOf(path);
  return (
    <Page>
      <PageHeading
        above={
          <TextLink to="/help" display="inline-flex" alignItems="center" minHeight="target">
            Help
          </TextLink>
        }
        lead={lead}
      >
        {topic.title}
      </PageHeading>
      <chakra.div
        display="grid"
        gridTemplateColumns={{ base: 'minmax(0, 1fr)', lg: 'minmax(0, 46rem) minmax(0, 18rem)' }}
        columnGap="16"
        rowGap="10"
        justifyContent="space-between"
        alignItems="start"
      >
        <div>
          {children}
          {cautions ? (
            <chakra.div marginTop="10" maxWidth="line">
              <Cautions lines={cautions} />
            </chakra.div>
          ) : null}
        </div>
        <chakra.aside position={{ lg: 'sticky' }} top="6">
          <chakra.nav aria-labelledby="also-explained">
            <chakra.h2 id="also-explained" fontSize="md" fontWeight="bold" marginBottom="2">
              Also explained
            </chakra.h2>
            <chakra.ul listStyleType="none" borderBottomWidth="1px" borderColor="hair">
              {topics
                .filter((each) => each.path !== path)
                .map((each) => (
                  <li key={each.path}>
                    <Other to={each.path}>{each.title}</Other>
                  </li>
                ))}
            </chakra.ul>
          </chakra.nav>
          <LinkButton to="/measure-up" marginTop="6" width={{ base: 'full', sm: 'auto' }}>
            Start your measure-up
          </LinkButton>
        </chakra.aside>
      </chakra.div>
    </Page>
  );
}
