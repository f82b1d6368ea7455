import { Injectable } from '@nestjs/common';
import type { BindValues } from '../database/bind-values';
import { Readers } from '../database/readers';

/** A SELECT of part ids in a column `id`, with the values that it binds. */
export interface PartTextQuery {
  sql: string;
  bind: BindValues;
}

/** The text index holds every three characters in a row; a shorter word is not in it. */
const SHORTEST_INDEXED = 3;

const INDEXED = 'SELECT rowid AS id FROM part_text WHERE part_text MATCH $indexed';

/** Beyond every character, so that a range from a prefix to it holds whatever begins with the prefix. */
const LAST = 'char(1114111)';

/** What begins with a short word; `$short…` is the word, `$cases…` its ways of writing it in small and capital letters. */
const beginning = (number: number): string => `
  SELECT p.id FROM json_each($cases${number}) AS c
    CROSS JOIN parts AS p ON p.manufacturer_part_number >= c.value AND p.manufacturer_part_number < c.value || ${LAST}
  UNION
  SELECT s.part_id FROM json_each($cases${number}) AS c
    JOIN company_part_numbers AS n ON n.number >= c.value AND n.number < c.value || ${LAST}
    JOIN approved_sources AS s ON s.company_part_number_id = n.id
  UNION
  SELECT p.id FROM parts AS p WHERE p.family_id IN (
    SELECT f.id FROM families AS f JOIN manufacturers AS m ON m.id = f.manufacturer_id
    WHERE instr(lower(f.code), $short${number}) = 1 OR instr(lower(f.name), $short${number}) = 1
      OR instr(lower(m.name), $short${number}) = 1)`;

/**
 * Finds parts by what their manufacturer part number, company part number, family and manufacturer are called. Words are
 * parted by blanks and must all be found, each anywhere; a word of one or two characters must begin one of the names.
 * Small and capital letters are the same, and every other character means itself.
 */
@Injectable()
export class PartText {
  constructor(private readonly readers: Readers) {}

  /** @returns the ids of exactly the parts that the text names, rising; every part for a text of nothing but blanks */
  async idsOf(text: string): Promise<number[]> {
    const { sql, bind } = partTextQuery(text);
    const rows = await this.readers.select<{ id: number }>(`${sql} ORDER BY 1`, bind);
    return rows.map(({ id }) => id);
  }
}

/** The same as a part of larger statements. */
export function partTextQuery(text: string): PartTextQuery {
  const words = [...new Set(text.split(/\s+/))].filter((word) => word !== '');
  const indexed = words.filter((word) => Array.from(word).length >= SHORTEST_INDEXED);
  const short = words.filter((word) => Array.from(word).length < SHORTEST_INDEXED);
  const selects = [
    ...(indexed.length > 0 ? [INDEXED] : []),
    ...short.map((_, number) => `SELECT id FROM (${beginning(number)})`),
  ];
  return {
    sql: selects.length > 0 ? selects.join(' INTERSECT ') : 'SELECT id FROM parts',
    bind: Object.assign(
      {},
      indexed.length > 0 ? { indexed: indexed.map(phrase).join(' ') } : {},
      ...short.map((word, number) => ({
        [`short${number}`]: word.toLowerCase(),
        [`cases${number}`]: JSON.stringify(cases(word)),
      })),
    ) as BindValues,
  };
}

/** In quotation marks, nothing is an operator of the text index. */
function phrase(word: string): string {
  return `"${word.replaceAll('"', '""')}"`;
}

/** ab → ab, aB, Ab, AB. */
function cases(word: string): string[] {
  return Array.from(word).reduce<string[]>(
    (beginnings, character) => {
      const letters = new Set([character.toLowerCase(), character.toUpperCase()]);
      return beginnings.flatMap((start) => [...letters].map((letter) => start + letter));
    },
    [''],
  );
}
