import { fractionAt, kneeOf, zeroOf } from '@resistry/engineering/derating/curve';
import type { DeratingCurve } from '@resistry/engineering/ratings/ratings';
import { technologies } from '@resistry/engineering/ratings/technology';
import { join } from 'node:path';
import { REPOSITORY_ROOT } from '../config/environment';
import { orderingCode } from '../parts/ordering-code';
import { readOrderingCode } from '../parts/read-ordering-code';
import { expandParts, valuesOf } from './expand-parts';
import { currentRevision, type Family } from './family';
import { readSeedData } from './seed-data';

const { families, manufacturers } = readSeedData(join(REPOSITORY_ROOT, 'seed-data'));
const partsOf = new Map(families.map((family) => [family.code, expandParts(family)]));

describe('the families of the demonstration', () => {
  it('are at least 24, over every technology, of every manufacturer', () => {
    expect(families.length).toBeGreaterThanOrEqual(24);
    expect(new Set(families.map((family) => family.technology))).toEqual(new Set(technologies));
    expect(new Set(families.map((family) => family.manufacturer))).toEqual(
      new Set(manufacturers.map(({ code }) => code)),
    );
    for (const { code } of families) expect(code).toMatch(/^[A-Z]{3,}$/);
  });

  it('offer at least 40 000 parts, no two under one number', () => {
    const numbers = [...partsOf.values()].flat().map((part) => part.manufacturerPartNumber);
    expect(numbers.length).toBeGreaterThanOrEqual(40_000);
    expect(new Set(numbers).size).toBe(numbers.length);
  });

  it('have sizes with two operating modes, with ratings at the terminal and at the case, and links', () => {
    const sizes = families.flatMap((family) => [...currentRevision(family).sizes.values()]);
    expect(sizes.filter((size) => size.modes.length === 2).length).toBeGreaterThan(5);
    const axes = new Set(sizes.flatMap((size) => size.modes.map((mode) => mode['derating_axis'])));
    expect(axes).toEqual(new Set(['ambient', 'terminal', 'case']));
    const withLinks = families.filter((family) =>
      [...currentRevision(family).sizes.values()].some((size) => size.isLinkToo),
    );
    expect(withLinks.map((family) => family.technology)).toEqual(
      expect.arrayContaining(['thick-film', 'carbon-film']),
    );
  });

  it('sell 0603 at 1/16 W and 50 V as well as at 1/10 W and 75 V', () => {
    // references.md, Ratings: the same size is sold with other ratings; never infer a rating from a size.
    const ratings = ['OTTR', 'BRIM'].map((code) => {
      const family = families.find((candidate) => candidate.code === code)!;
      const size = currentRevision(family).sizes.get('0603')!;
      return [size.modes[0]!['rated_dissipation_watt'], size.columns['limiting_element_voltage_volt']];
    });
    expect(ratings).toEqual([
      [0.0625, 50],
      [0.1, 75],
    ]);
  });

  it('keep their older revisions, which differ', () => {
    const revised = families.filter((family) => family.revisions.length > 1);
    expect(revised.length).toBeGreaterThanOrEqual(6);
    for (const { revisions } of revised) expect(revisions[0]!.sizes).not.toEqual(revisions[1]!.sizes);
  });

  it.each(families)('$code: every range row holds values, and every size has packagings', (family) => {
    const revision = currentRevision(family);
    for (const range of revision.ranges) expect(valuesOf(range).length).toBeGreaterThan(0);
    const packed = new Set(revision.packagings.flatMap(({ sizes }) => sizes));
    expect(packed).toEqual(new Set(family.sizes.map(({ code }) => code)));
  });

  it.each(families)('$code: its ratings agree with each other', (family) => {
    for (const { sizes } of family.revisions) {
      for (const { columns, modes } of sizes.values()) {
        const [limiting, overload] = [
          columns['limiting_element_voltage_volt'],
          columns['overload_voltage_volt'],
        ];
        if (isNumber(limiting) && isNumber(overload)) expect(overload).toBeGreaterThan(limiting);
        for (const mode of modes) {
          const points = JSON.parse(String(mode['derating_points'])) as [number, number][];
          const curve: DeratingCurve = { axis: 'ambient', points };
          const dissipation = mode['rated_dissipation_watt'];
          const highest = mode['max_element_temperature_celsius'];
          const thermal = mode['thermal_resistance_kelvin_per_watt'];
          const falls = fractionAt(curve, zeroOf(curve)) === 0;
          if (falls && isNumber(highest)) expect(zeroOf(curve)).toBeLessThanOrEqual(highest);
          // R_th = (T_film at P70 − 70 °C) / P70 (references.md, Ratings): the film stays below its limit at the knee.
          if (isNumber(thermal) && isNumber(highest) && isNumber(dissipation)) {
            expect(kneeOf(curve) + thermal * dissipation).toBeLessThanOrEqual(highest);
          }
        }
      }
    }
  });

  it.each(families)('$code: the examples of its datasheet are written and read back', (family: Family) => {
    const template = currentRevision(family).orderingCode;
    const vocabulary = vocabularyOf(family);
    expect(family.examples.length).toBeGreaterThan(0);
    for (const { code, size, resistance, tolerance, tcr, packaging } of family.examples) {
      const part = { familyCode: family.code, sizeCode: size, resistance, tolerance, tcr };
      expect(orderingCode(template, { ...part, packagingCode: packaging })).toBe(code);
      const read = readOrderingCode(template, code, vocabulary);
      expect(read).toMatchObject({ sizeCode: size, resistance, packagingCode: packaging ?? null });
    }
  });

  it('can be told from their numbers: each reads back to its size, value and tolerance', () => {
    for (const family of families) {
      const template = currentRevision(family).orderingCode;
      const vocabulary = vocabularyOf(family);
      // Every thirteenth, a step that falls on every mantissa in turn.
      const some = (partsOf.get(family.code) ?? []).filter((_, place) => place % 13 === 0);
      for (const part of some) {
        const read = readOrderingCode(template, part.manufacturerPartNumber, vocabulary);
        expect([read?.sizeCode, read?.resistance, read?.tolerance]).toEqual([
          part.size,
          part.resistance,
          part.tolerance,
        ]);
      }
    }
  });
});

function isNumber(value: unknown): value is number {
  return typeof value === 'number';
}

function vocabularyOf(family: Family): Parameters<typeof readOrderingCode>[2] {
  return {
    familyCode: family.code,
    sizeCodes: family.sizes.map(({ code }) => code),
    packagingCodes: currentRevision(family).packagings.map(({ code }) => code),
  };
}
