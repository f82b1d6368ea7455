import { chakra } from '@chakra-ui/react';
import { type SyntheticEvent, useCallback, useRef } from 'react';
import { useLocation, useNavigate } from 'react-router-dom';
import { useSingleKey } from '../components/single-key';

const Field = chakra('input', {
  base: {
    width: 'full',
    bg: 'transparent',
    border: 0,
    borderBottom: '1px solid',
    borderColor: 'border.field',
    borderRadius: 0,
    px: 0,
    py: 1,
    fontSize: 'sm',
    '&::-webkit-search-cancel-button': { display: 'none' },
  },
});

/** Looks for a part number, family or manufacturer in Find; a duty that is already stated there stays. */
export function QuickSearch({ onSearched }: { onSearched?: () => void }) {
  const navigate = useNavigate();
  const location = useLocation();
  const inputRef = useRef<HTMLInputElement>(null);

  // A field that is hidden (the bar on a narrow screen) takes no focus, and the key stays with the page.
  const focus = useCallback((): boolean => {
    inputRef.current?.focus();
    if (inputRef.current === null || document.activeElement !== inputRef.current) return false;
    inputRef.current.select();
    return true;
  }, []);
  useSingleKey('/', focus);

  const search = (event: SyntheticEvent): void => {
    event.preventDefault();
    const kept = new URLSearchParams(location.pathname === '/find' ? location.search : '');
    const text = inputRef.current?.value.trim() ?? '';
    if (text === '') kept.delete('text');
    else kept.set('text', text);
    onSearched?.();
    void navigate(`/find?${kept.toString()}`);
  };

  const shown = location.pathname === '/find' ? (new URLSearchParams(location.search).get('text') ?? '') : '';
  return (
    <chakra.form role="search" onSubmit={search} width="full">
      <Field
        key={shown}
        ref={inputRef}
        type="search"
        name="text"
        defaultValue={shown}
        aria-label="Part number, family or manufacturer"
        aria-keyshortcuts="/"
        title="Press / to search from anywhere"
        placeholder="Part number, family, manufacturer"
        autoComplete="off"
        spellCheck={false}
        maxLength={200}
      />
    </chakra.form>
  );
}
