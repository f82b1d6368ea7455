import { grounds, inks, lines } from './colours';
import { contrastRatio } from './contrast';

describe('the colours of the interface', () => {
  it('computes 21 to 1 for black on white (WCAG 2.2, definition of contrast ratio)', () => {
    expect(contrastRatio('#000000', '#ffffff')).toBeCloseTo(21, 10);
  });

  // WCAG 2.2, success criterion 1.4.3: at least 4.5 to 1 for text.
  describe.each(Object.entries(inks))('ink %s', (_ink, ink) => {
    it.each(Object.entries(grounds))('reads on %s in light and dark', (_ground, ground) => {
      expect(contrastRatio(ink.light, ground.light)).toBeGreaterThanOrEqual(4.5);
      expect(contrastRatio(ink.dark, ground.dark)).toBeGreaterThanOrEqual(4.5);
    });
  });

  it('bounds a field with at least 3 to 1 (WCAG 2.2, success criterion 1.4.11)', () => {
    for (const ground of [grounds.page, grounds.sheet, grounds.field]) {
      expect(contrastRatio(lines.field.light, ground.light)).toBeGreaterThanOrEqual(3);
      expect(contrastRatio(lines.field.dark, ground.dark)).toBeGreaterThanOrEqual(3);
    }
  });
});
