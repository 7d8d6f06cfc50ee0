import { chakra } from '@chakra-ui/react';
import { Outlet, ScrollRestoration } from 'react-router-dom';
import { Footer } from './footer';
import { Header } from './header';
import { OfflineNotice } from './offline-notice';
import { PendingBar } from './pending-bar';
import { SkipLink } from './skip-link';
import { useArrival } from './use-arrival';

/** What every page stands in. */
export function Shell() {
  useArrival();
  return (
    <>
      <SkipLink />
      <PendingBar />
      <Header />
      <chakra.main id="main" tabIndex={-1} flex="1" _focus={{ outline: 'none' }}>
        <Outlet />
      </chakra.main>
      <Footer />
      <OfflineNotice />
      <ScrollRestoration />
    </>
  );
}
