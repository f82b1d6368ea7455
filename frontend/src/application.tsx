import { ChakraProvider } from '@chakra-ui/react';
import { QueryClientProvider } from '@tanstack/react-query';
import { ThemeProvider } from 'next-themes';
import { useState } from 'react';
import { RouterProvider } from 'react-router-dom';
import { createQueryClient } from './api/query-client';
import { createRouter } from './router';
import { system } from './theme/system';

/** The providers around every page. */
export function Application() {
  const [queryClient] = useState(createQueryClient);
  const [router] = useState(createRouter);
  return (
    <ChakraProvider value={system}>
      <ThemeProvider
        attribute="class"
        storageKey="resistry-theme"
        disableTransitionOnChange
        // Keeps React from running the script in the page; theme-before-paint.js has already done its work.
        scriptProps={{ type: 'application/json' }}
      >
        <QueryClientProvider client={queryClient}>
          <RouterProvider router={router} />
        </QueryClientProvider>
      </ThemeProvider>
    </ChakraProvider>
  );
}
