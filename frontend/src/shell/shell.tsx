import { chakra } from '@chakra-ui/react';
import { Suspense, useEffect, useRef } from 'react';
import { Outlet, useLocation } from 'react-router-dom';
import { Loading } from '../components/states';
import { RequireSession } from './require-session';
import { SkipLink, contentId } from './skip-link';
import { TopBar } from './top-bar';

/** Puts the keyboard at the start of a page that was just opened, as a full page load would. */
function useFocusOnNewPage(): void {
  const { pathname } = useLocation();
  const shownPath = useRef(pathname);
  useEffect(() => {
    if (shownPath.current === pathname) return;
    shownPath.current = pathname;
    document.getElementById(contentId)?.focus({ preventScroll: true });
  }, [pathname]);
}

/** The frame of every page behind the sign-in. The bar stays; each page scrolls beneath it as it needs. */
export function Shell() {
  useFocusOnNewPage();
  return (
    <RequireSession>
      <chakra.div
        display="flex"
        flexDirection="column"
        height="100dvh"
        overflow="hidden"
        _print={{ height: 'auto' }}
      >
        <SkipLink />
        <TopBar />
        <chakra.main
          id={contentId}
          tabIndex={-1}
          flex={1}
          minHeight={0}
          overflow="auto"
          outline="none"
          position="relative"
        >
          <Suspense fallback={<Loading label="Opening the page" />}>
            <Outlet />
          </Suspense>
        </chakra.main>
      </chakra.div>
    </RequireSession>
  );
}
