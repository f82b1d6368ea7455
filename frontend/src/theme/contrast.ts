/**
 * Relative luminance of an sRGB colour, as WCAG 2.2 defines it.
 * @param colour `#rrggbb`
 * @returns 0 (black) to 1 (white)
 */
function relativeLuminance(colour: string): number {
  const channel = (start: number): number => {
    const value = Number.parseInt(colour.slice(start, start + 2), 16) / 255;
    return value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4;
  };
  return 0.2126 * channel(1) + 0.7152 * channel(3) + 0.0722 * channel(5);
}

/**
 * Contrast ratio of two colours, as WCAG 2.2 defines it.
 * @returns 1 (the same) to 21 (black on white)
 */
export function contrastRatio(first: string, second: string): number {
  const [darker = 0, lighter = 0] = [relativeLuminance(first), relativeLuminance(second)].sort(
    (a, b) => a - b,
  );
  return (lighter + 0.05) / (darker + 0.05);
}
