import { ChakraProvider } from '@chakra-ui/react';
import { QueryClientProvider, type QueryClient } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { system } from '../theme/system';

export function Providers({ queries, children }: { queries: QueryClient; children: ReactNode }) {
  return (
    <QueryClientProvider client={queries}>
      <ChakraProvider value={system}>{children}</ChakraProvider>
    </QueryClientProvider>
  );
}
