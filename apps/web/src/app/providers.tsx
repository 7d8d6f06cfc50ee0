import { ChakraProvider } from '@chakra-ui/react';
import { QueryClientProvider, type QueryClient } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { system } from '../theme/system';

export interface ProvidersProps {
  queries: QueryClient;
  children: ReactNode;
}

export function Providers({ queries, children }: ProvidersProps) {
  return (
    <QueryClientProvider client={queries}>
      <ChakraProvider value={system}>{children}</ChakraProvider>
    </QueryClientProvider>
  );
}
