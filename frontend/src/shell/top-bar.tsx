import { chakra } from '@chakra-ui/react';
import { Suspense, lazy, useCallback, useState } from 'react';
import { Link, useLocation } from 'react-router-dom';
import { useAbility } from '../api/ability';
import { BrandMark } from '../components/brand-mark';
import { Button } from '../components/button';
import { FloatingPanel } from '../components/floating-panel';
import { useSingleKey } from '../components/single-key';
import { useDisclosure } from '../components/use-disclosure';
import { AccountMenu } from './account-menu';
import { type NavigationItem, navigationFor } from './navigation';
import { NavigationLink } from './navigation-link';
import { QuickSearch } from './quick-search';

const KeyHelp = lazy(() => import('./key-help'));

const Bar = chakra('header', {
  base: {
    display: 'flex',
    alignItems: 'center',
    gap: { base: 4, lg: 6 },
    height: '3.25rem',
    px: { base: 4, md: 6 },
    borderBottom: '1px solid',
    borderColor: 'border',
    bg: 'bg',
    position: 'relative',
    zIndex: 'bar',
    flexShrink: 0,
  },
});

function Brand() {
  return (
    <chakra.span
      css={{
        '& > a': { display: 'flex', alignItems: 'center', gap: 2.5, color: 'fg', textDecoration: 'none' },
      }}
      fontSize="lg"
      fontWeight="semibold"
    >
      <Link to="/find" aria-label="Resistry, to Find">
        <BrandMark />
        Resistry
      </Link>
    </chakra.span>
  );
}

function Links({ items, onGone }: { items: NavigationItem[]; onGone?: () => void }) {
  return items.map((item) => (
    <li key={item.to}>
      <NavigationLink to={item.to} onClick={onGone}>
        {item.label}
      </NavigationLink>
    </li>
  ));
}

/** The administrator's places, folded behind one word so that the daily work keeps the bar. */
function AdministrationLinks({ items }: { items: NavigationItem[] }) {
  const { open, close, rootRef, buttonProps, panelId } = useDisclosure<HTMLLIElement>();
  const { pathname } = useLocation();
  if (items.length === 0) return null;
  const inside = items.some((item) => pathname.startsWith(item.to));
  return (
    <chakra.li ref={rootRef} position="relative">
      <chakra.button
        type="button"
        {...buttonProps}
        py={1}
        color={inside ? 'fg' : 'fg.muted'}
        fontWeight={inside ? 'semibold' : 'normal'}
        _hover={{ color: 'fg' }}
      >
        Administration
      </chakra.button>
      {open && (
        <FloatingPanel id={panelId} insetEnd="auto" insetStart={-3} px={3}>
          <chakra.ul display="grid" gap={1}>
            <Links items={items} onGone={close} />
          </chakra.ul>
        </FloatingPanel>
      )}
    </chakra.li>
  );
}

function NarrowMenu({ items }: { items: NavigationItem[] }) {
  const { open, close, rootRef, buttonProps, panelId } = useDisclosure();
  return (
    <chakra.div ref={rootRef} position="relative" display={{ base: 'block', lg: 'none' }}>
      <chakra.button type="button" {...buttonProps} py={2} px={1}>
        Menu
      </chakra.button>
      {open && (
        <FloatingPanel id={panelId} px={4} py={3} minWidth="17rem" insetEnd="auto" insetStart={-1}>
          <QuickSearch onSearched={close} />
          <chakra.nav aria-label="Places" mt={3}>
            <chakra.ul display="grid" gap={2}>
              <Links items={items} onGone={close} />
            </chakra.ul>
          </chakra.nav>
        </FloatingPanel>
      )}
    </chakra.div>
  );
}

/** The bar at the head of every page: mark, places by permission, text search, the person. */
export function TopBar() {
  const [keysShown, setKeysShown] = useState(false);
  const showKeys = useCallback(() => {
    setKeysShown(true);
    return true;
  }, []);
  useSingleKey('?', showKeys);
  const ability = useAbility();
  const work = navigationFor(ability, 'work');
  const administration = navigationFor(ability, 'administration');
  return (
    <Bar>
      <NarrowMenu items={[...work, ...administration]} />
      <Brand />
      <chakra.nav aria-label="Places" display={{ base: 'none', lg: 'block' }} fontSize="sm">
        <chakra.ul display="flex" alignItems="center" gap={6}>
          <Links items={work} />
          <AdministrationLinks items={administration} />
        </chakra.ul>
      </chakra.nav>
      <chakra.div flex={1} />
      <chakra.div display={{ base: 'none', lg: 'block' }} width="14.5rem" flexShrink={1}>
        <QuickSearch />
      </chakra.div>
      <chakra.span display={{ base: 'none', lg: 'inline-flex' }}>
        <Button variant="plain" aria-keyshortcuts="?" aria-haspopup="dialog" onClick={showKeys}>
          Keys
        </Button>
      </chakra.span>
      <AccountMenu />
      {keysShown && (
        <Suspense fallback={null}>
          <KeyHelp onClose={() => setKeysShown(false)} />
        </Suspense>
      )}
    </Bar>
  );
}
