import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import { Readers } from '../database/readers';
import type { CertificateDto, CitationDto, DatasheetDto, DeclarationDto } from './dto/papers.dto';

export interface DatasheetRow {
  id: number;
  document_number: string;
  revision: string;
  title: string;
  issued_on: string;
  page_count: number;
}

interface DeclarationRow {
  kind: 'RoHS' | 'REACH';
  dated_on: string;
  exemption: string | null;
  statement: string;
}

interface CertificateRow {
  kind: 'safety' | 'automotive';
  standard: string;
  number: string;
  issued_on: string;
  expires_on: string | null;
  size_id: number | null;
  size_code: string | null;
  metric_code: string | null;
}

interface CitationRow {
  field: string;
  size_id: number | null;
  size_code: string | null;
  metric_code: string | null;
  datasheet_id: number;
  document_number: string;
  revision: string;
  page: number;
  note: string | null;
}

/** Reading what proves a family's claims: datasheets, citations of them, declarations and certificates. */
@Injectable()
export class FamilyPapers {
  constructor(
    private readonly readers: Readers,
    private readonly clock: Clock,
  ) {}

  /** The newest first. */
  async datasheets(familyId: number): Promise<DatasheetDto[]> {
    const rows = await this.readers.select<DatasheetRow>(
      `SELECT id, document_number, revision, title, issued_on, page_count FROM datasheets
        WHERE family_id = $familyId ORDER BY issued_on DESC, id DESC`,
      { familyId },
    );
    return rows.map(presentDatasheet);
  }

  async declarations(familyId: number): Promise<DeclarationDto[]> {
    const rows = await this.readers.select<DeclarationRow>(
      `SELECT kind, dated_on, exemption, statement FROM declarations
        WHERE family_id = $familyId ORDER BY kind DESC, dated_on DESC, id`,
      { familyId },
    );
    return rows.map((row) => ({
      kind: row.kind,
      datedOn: row.dated_on,
      exemption: row.exemption ?? undefined,
      statement: row.statement,
    }));
  }

  /** @param sizeId leaves out what covers only other sizes */
  async certificates(familyId: number, sizeId?: number): Promise<CertificateDto[]> {
    const rows = await this.readers.select<CertificateRow>(
      `SELECT c.kind, c.standard, c.number, c.issued_on, c.expires_on, s.id AS size_id, s.code AS size_code, s.metric_code
        FROM certificates AS c LEFT JOIN sizes AS s ON s.id = c.size_id
        WHERE c.family_id = $familyId AND ($sizeId IS NULL OR c.size_id IS NULL OR c.size_id = $sizeId)
        ORDER BY c.kind DESC, s.position, c.issued_on DESC, c.id`,
      { familyId, sizeId: sizeId ?? null },
    );
    const today = this.clock.today();
    return rows.map((row) => ({
      kind: row.kind,
      standard: row.standard,
      number: row.number,
      size: presentSize(row),
      issuedOn: row.issued_on,
      expiresOn: row.expires_on ?? undefined,
      expired: row.expires_on !== null && row.expires_on < today,
    }));
  }

  /** @param sizeId leaves out what was cited for other sizes */
  async citations(revisionId: number, sizeId?: number): Promise<CitationDto[]> {
    const rows = await this.readers.select<CitationRow>(
      `SELECT c.field, s.id AS size_id, s.code AS size_code, s.metric_code, d.id AS datasheet_id, d.document_number,
          d.revision, c.page, c.note
        FROM citations AS c JOIN datasheets AS d ON d.id = c.datasheet_id LEFT JOIN sizes AS s ON s.id = c.size_id
        WHERE c.revision_id = $revisionId AND ($sizeId IS NULL OR c.size_id IS NULL OR c.size_id = $sizeId)
        ORDER BY c.field, s.position NULLS FIRST, c.id`,
      { revisionId, sizeId: sizeId ?? null },
    );
    return rows.map((row) => ({
      field: row.field,
      size: presentSize(row),
      datasheet: { id: row.datasheet_id, documentNumber: row.document_number, revision: row.revision },
      page: row.page,
      note: row.note ?? undefined,
    }));
  }
}

export function presentDatasheet(row: DatasheetRow): DatasheetDto {
  return {
    id: row.id,
    documentNumber: row.document_number,
    revision: row.revision,
    title: row.title,
    issuedOn: row.issued_on,
    pageCount: row.page_count,
  };
}

function presentSize(row: {
  size_id: number | null;
  size_code: string | null;
  metric_code: string | null;
}): CertificateDto['size'] {
  if (row.size_id === null || row.size_code === null) return undefined;
  return { id: row.size_id, code: row.size_code, metricCode: row.metric_code ?? undefined };
}
