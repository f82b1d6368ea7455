import { chakra } from '@chakra-ui/react';
import { useTheme } from 'next-themes';

const themes = [
  { value: 'light', label: 'Light' },
  { value: 'dark', label: 'Dark' },
  { value: 'system', label: 'As the system' },
] as const;

/** Light paper, dark paper, or what the system asks for. */
export function ThemeChoice() {
  const { theme, setTheme } = useTheme();
  return (
    <chakra.fieldset px={3} py={1}>
      <chakra.legend fontSize="xs" color="fg.muted" mb={1} p={0}>
        Appearance
      </chakra.legend>
      {themes.map(({ value, label }) => (
        <chakra.label
          key={value}
          display="flex"
          gap={2}
          alignItems="center"
          py={1}
          fontSize="sm"
          cursor="pointer"
        >
          <chakra.input
            type="radio"
            name="theme"
            value={value}
            checked={(theme ?? 'system') === value}
            onChange={() => setTheme(value)}
            accentColor="accent"
          />
          {label}
        </chakra.label>
      ))}
    </chakra.fieldset>
  );
}
