import { chakra } from '@chakra-ui/react';

/** The product's mark: an axial resistor of 4.7 kΩ ±1 %, banded yellow, violet, black, brown, brown. */
export function BrandMark() {
  return (
    <chakra.svg viewBox="0 0 58 16" width="3.6rem" height="1rem" aria-hidden="true">
      <path d="M0 8H58" stroke="#8f9498" strokeWidth="1.4" />
      <path
        d="M14 3.2C14 2 15 1.4 16.2 1.4H19.4C20.6 1.4 21 2.6 22.4 2.6H35.6C37 2.6 37.4 1.4 38.6 1.4H41.8C43 1.4 44 2 44 3.2V12.8C44 14 43 14.6 41.8 14.6H38.6C37.4 14.6 37 13.4 35.6 13.4H22.4C21 13.4 20.6 14.6 19.4 14.6H16.2C15 14.6 14 14 14 12.8Z"
        fill="#c9a878"
      />
      <path d="M17 1.4V14.6" stroke="#d8b400" strokeWidth="2.2" />
      <path d="M23.6 2.6V13.4" stroke="#6d3fa3" strokeWidth="2.2" />
      <path d="M28.2 2.6V13.4" stroke="#232323" strokeWidth="2.2" />
      <path d="M32.8 2.6V13.4" stroke="#7a4a21" strokeWidth="2.2" />
      <path d="M41 1.4V14.6" stroke="#7a4a21" strokeWidth="2.2" />
    </chakra.svg>
  );
}
