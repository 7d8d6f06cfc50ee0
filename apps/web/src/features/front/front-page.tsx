import { Page } from '../../components/page';
import { Hero } from './hero';
import { HowItGoes } from './how-it-goes';
import { LookAround } from './look-around';
import { Partners } from './partners';
import { TrustFacts } from './trust-facts';
import { VerdictKey } from './verdict-key';

export function FrontPage() {
  return (
    <Page>
      <Hero />
      <TrustFacts />
      <HowItGoes />
      <VerdictKey />
      <LookAround />
      <Partners />
    </Page>
  );
}
