import { ChakraProvider } from '@chakra-ui/react';
import { type RenderResult, render } from '@testing-library/react';
import type { ReactElement } from 'react';
import { system } from '../theme/system';

/** Renders a component with the theme around it. */
export function renderInTheme(element: ReactElement): RenderResult {
  return render(element, {
    wrapper: ({ children }) => <ChakraProvider value={system}>{children}</ChakraProvider>,
  });
}
