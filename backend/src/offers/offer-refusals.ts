import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import { ClashProblem, NotFoundProblem } from '../common/problems/problems';
import { Writer } from '../database/writer';
import { clashesOfTerms, type OfferTerms } from './offer-terms';

/** What terms must fulfil to be kept: by themselves, and against the part and the suppliers there are. */
@Injectable()
export class OfferRefusals {
  constructor(private readonly writer: Writer) {}

  /** @throws NotFoundProblem where there is no such part @throws ClashProblem naming every field that clashes */
  async demand(transaction: Transaction, partId: number, terms: OfferTerms): Promise<void> {
    const [part] = await this.writer.select<{ name: string; packagings: string }>(
      transaction,
      `SELECT p.manufacturer_part_number AS name, (SELECT json_group_array(k.code) FROM packagings AS k
          WHERE k.revision_id = f.current_revision_id AND k.size_id = p.size_id) AS packagings
        FROM parts AS p JOIN families AS f ON f.id = p.family_id WHERE p.id = $partId`,
      { partId },
    );
    if (!part) throw new NotFoundProblem(`There is no part ${partId}.`);
    const suppliers = await this.writer.select(
      transaction,
      'SELECT 1 FROM suppliers WHERE id = $supplierId',
      {
        supplierId: terms.supplierId,
      },
    );
    const packagings = JSON.parse(part.packagings) as string[];
    const errors = [
      ...(suppliers.length === 0 ? [{ pointer: '/supplierId', message: 'There is no such supplier.' }] : []),
      ...(packagings.includes(terms.packaging)
        ? []
        : [{ pointer: '/packaging', message: `It comes in ${packagings.join(', ')}.` }]),
      ...clashesOfTerms(terms),
    ];
    if (errors.length === 0) return;
    const words = [...new Set(errors.map(({ message }) => message))].join(' ');
    throw new ClashProblem(`The offer for ${part.name} cannot be kept: ${words}`, errors);
  }
}
