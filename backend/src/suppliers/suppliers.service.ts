import { Injectable } from '@nestjs/common';
import { Readers } from '../database/readers';
import type { NamedDto } from '../parts/summary/part-summary.dto';

/** Reading suppliers. */
@Injectable()
export class SuppliersService {
  constructor(private readonly readers: Readers) {}

  /** All of them, by name. */
  async list(): Promise<NamedDto[]> {
    return this.readers.select<NamedDto>('SELECT id, code, name FROM suppliers ORDER BY name');
  }
}
