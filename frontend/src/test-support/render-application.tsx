import { ChakraProvider } from '@chakra-ui/react';
import { QueryClientProvider } from '@tanstack/react-query';
import { type RenderResult, render } from '@testing-library/react';
import { RouterProvider, createMemoryRouter } from 'react-router-dom';
import { createQueryClient } from '../api/query-client';
import { routes } from '../router';
import { system } from '../theme/system';

/** The whole application at an address, and where it has gone since. */
export function renderApplication(address: string): RenderResult & { addressNow: () => string } {
  const router = createMemoryRouter(routes, { initialEntries: [address] });
  const result = render(
    <ChakraProvider value={system}>
      <QueryClientProvider client={createQueryClient()}>
        <RouterProvider router={router} />
      </QueryClientProvider>
    </ChakraProvider>,
  );
  const addressNow = (): string => {
    const { pathname, search } = router.state.location;
    return decodeURIComponent(pathname + search);
  };
  return { ...result, addressNow };
}
