import { chakra } from '@chakra-ui/react';
import { Link } from 'react-router-dom';
import { useUser } from '../api/ability';
import { FloatingPanel } from '../components/floating-panel';
import { useDisclosure } from '../components/use-disclosure';
import { roleWords } from '../wording/role-words';
import { SignOutButton } from './sign-out-button';
import { ThemeChoice } from './theme-choice';

const panelItem = {
  display: 'block',
  width: 'full',
  textAlign: 'start',
  px: 3,
  py: 1.5,
  fontSize: 'sm',
  color: 'fg',
  textDecoration: 'none',
  _hover: { bg: 'bg.hover' },
} as const;

/** Who is signed in, with what belongs to the person: account, appearance, sign-out. */
export function AccountMenu() {
  const user = useUser();
  const { open, close, rootRef, buttonProps, panelId } = useDisclosure();
  if (user === undefined) return null;
  return (
    <chakra.div ref={rootRef} position="relative" flexShrink={0}>
      <chakra.button type="button" {...buttonProps} fontSize="sm" py={1} whiteSpace="nowrap">
        <chakra.span fontWeight="medium">{user.name}</chakra.span>{' '}
        <chakra.span color="fg.muted" display={{ base: 'none', md: 'inline' }}>
          {user.roles.map((role) => roleWords[role]).join(', ')}
        </chakra.span>
      </chakra.button>
      {open && (
        <FloatingPanel id={panelId}>
          <chakra.div
            px={3}
            pb={2}
            mb={1}
            borderBottom="1px solid"
            borderColor="border"
            fontSize="xs"
            color="fg.muted"
          >
            {user.email}
            <chakra.span display={{ base: 'block', md: 'none' }}>
              {user.roles.map((role) => roleWords[role]).join(', ')}
            </chakra.span>
          </chakra.div>
          <chakra.div css={{ '& > a, & > button': panelItem }}>
            <Link to="/account" onClick={close}>
              Own account
            </Link>
            <SignOutButton />
          </chakra.div>
          <chakra.div borderTop="1px solid" borderColor="border" mt={1} pt={2}>
            <ThemeChoice />
          </chakra.div>
        </FloatingPanel>
      )}
    </chakra.div>
  );
}
