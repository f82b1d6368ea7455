import { Injectable } from '@nestjs/common';
import { NotFoundProblem } from '../common/problems/problems';
import { rowsOfPage } from '../common/reading/page-query';
import { containsWords, wordsOf } from '../common/reading/words';
import { Readers } from '../database/readers';
import { PartSummaries, presentPartSummary } from '../parts/summary/part-summaries';
import type {
  ApprovedSourceDto,
  CompanyPartNumberDto,
  CompanyPartNumberList,
  CompanyPartNumberQuery,
} from './dto/company-part-number.dto';

interface SummaryRow {
  id: number;
  number: string;
  description: string;
  sources: number;
  sound_sources: number;
}

interface NumberRow {
  id: number;
  number: string;
  description: string;
  entered_by: number;
  entered_by_name: string;
  entered_at: string;
}

interface SourceRow {
  part_id: number;
  position: number;
  added_by: number;
  added_by_name: string;
  added_at: string;
}

const MATCHING = `FROM company_part_numbers AS c
  WHERE ${containsWords("c.number || ' ' || c.description", '$words')}`;

const SUMMARIES = `
  SELECT c.id, c.number, c.description,
    (SELECT count(*) FROM approved_sources WHERE company_part_number_id = c.id) AS sources,
    (SELECT count(*) FROM approved_sources AS a JOIN parts AS p ON p.id = a.part_id WHERE a.company_part_number_id = c.id
      AND p.approval IN ('approved', 'preferred') AND p.supply = 'active') AS sound_sources
  ${MATCHING} ORDER BY c.number LIMIT $limit OFFSET $offset`;

/** Reading company part numbers with their approved manufacturer lists. */
@Injectable()
export class CompanyPartNumbersService {
  constructor(
    private readonly readers: Readers,
    private readonly parts: PartSummaries,
  ) {}

  /** By number. */
  async list(query: CompanyPartNumberQuery): Promise<CompanyPartNumberList> {
    const words = wordsOf(query.q ?? '');
    const [counted] = await this.readers.select<{ total: number }>(`SELECT count(*) AS total ${MATCHING}`, {
      words,
    });
    const rows = await this.readers.select<SummaryRow>(SUMMARIES, { words, ...rowsOfPage(query) });
    return {
      total: counted?.total ?? 0,
      items: rows.map((row) => ({
        id: row.id,
        number: row.number,
        description: row.description,
        sources: row.sources,
        soundSources: row.sound_sources,
      })),
    };
  }

  /** @throws NotFoundProblem */
  async find(number: string): Promise<CompanyPartNumberDto> {
    const row = await this.readers.lookUp<NumberRow>(
      `SELECT c.id, c.number, c.description, c.entered_by, u.name AS entered_by_name, c.entered_at
        FROM company_part_numbers AS c JOIN users AS u ON u.id = c.entered_by WHERE c.number = $number`,
      { number },
    );
    if (!row) throw new NotFoundProblem('There is no such company part number.');
    return {
      id: row.id,
      number: row.number,
      description: row.description,
      enteredBy: { id: row.entered_by, name: row.entered_by_name },
      enteredAt: row.entered_at,
      sources: await this.sources(row.id),
    };
  }

  private async sources(id: number): Promise<ApprovedSourceDto[]> {
    const rows = await this.readers.select<SourceRow>(
      `SELECT a.part_id, a.position, a.added_by, u.name AS added_by_name, a.added_at
        FROM approved_sources AS a JOIN users AS u ON u.id = a.added_by
        WHERE a.company_part_number_id = $id ORDER BY a.position, a.part_id`,
      { id },
    );
    const parts = await this.parts.rows(rows.map(({ part_id: partId }) => partId));
    return rows.flatMap((row) => {
      const part = parts.get(row.part_id);
      if (!part) return [];
      return [
        {
          position: row.position,
          addedBy: { id: row.added_by, name: row.added_by_name },
          addedAt: row.added_at,
          part: presentPartSummary(part),
        },
      ];
    });
  }
}
