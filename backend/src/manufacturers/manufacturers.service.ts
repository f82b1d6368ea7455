import { Injectable } from '@nestjs/common';
import { Readers } from '../database/readers';
import type { ManufacturerDto } from './dto/manufacturer.dto';

interface ManufacturerRow {
  id: number;
  code: string;
  name: string;
  country: string | null;
  note: string | null;
  families: number;
  parts: number;
}

/** Reading manufacturers. */
@Injectable()
export class ManufacturersService {
  constructor(private readonly readers: Readers) {}

  /** All of them, by name. */
  async list(): Promise<ManufacturerDto[]> {
    const rows = await this.readers.select<ManufacturerRow>(
      `WITH counted AS MATERIALIZED (SELECT family_id, count(*) AS parts FROM parts GROUP BY family_id)
       SELECT m.id, m.code, m.name, m.country, m.note, count(f.id) AS families, coalesce(sum(c.parts), 0) AS parts
       FROM manufacturers AS m LEFT JOIN families AS f ON f.manufacturer_id = m.id
         LEFT JOIN counted AS c ON c.family_id = f.id
       GROUP BY m.id ORDER BY m.name`,
    );
    return rows.map((row) => ({
      id: row.id,
      code: row.code,
      name: row.name,
      country: row.country ?? undefined,
      note: row.note ?? undefined,
      families: row.families,
      parts: row.parts,
    }));
  }
}
