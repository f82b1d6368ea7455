import type { PartDetails } from '../features/parts/requests/get-part';
import { examplePart } from './assessed-part';

const datasheet = { id: 4, documentNumber: 'DS-ODF', revision: 'C' };
const librarian = { id: 3, name: 'P. Holm' };

/** The invented part of examplePart with everything its page shows. */
export function examplePartDetails(rest: Partial<PartDetails> = {}): PartDetails {
  const { manufacturerPartNumber, manufacturer, family } = examplePart();
  return {
    ...examplePart(),
    version: 4,
    enteredBy: librarian,
    enteredAt: '2025-01-10T09:00:00.000Z',
    revision: { id: 1, number: 1, publishedAt: '2025-01-20T09:00:00.000Z', datasheet },
    modes: [
      {
        name: 'standard',
        ratings: {
          technology: 'thick-film',
          resistance: 4700,
          tolerance: 0.01,
          tcr: 1e-4,
          ratedDissipation: 0.25,
          derating: {
            axis: 'ambient',
            points: [
              [70, 1],
              [155, 0],
            ],
          },
        },
      },
      { name: 'power', ratings: { technology: 'thick-film', resistance: 4700, ratedDissipation: 0.4 } },
    ],
    citations: [{ field: 'ratedDissipation', datasheet, page: 3 }],
    orderingCodes: [],
    sources: [
      {
        id: 122,
        manufacturerPartNumber,
        manufacturer,
        family,
        position: 1,
        approval: 'preferred',
        supply: 'active',
        unitPrice: 0.006,
      },
    ],
    offers: [
      {
        id: 1,
        supplier: { id: 2, code: 'MAR', name: 'Marram Supply' },
        packaging: 'T',
        currency: 'EUR',
        minimumOrder: 100,
        orderMultiple: 100,
        leadTimeDays: 14,
        validFrom: '2026-11-04',
        validUntil: '2027-09-06',
        inForce: true,
        priceBreaks: [{ quantity: 1000, unitPrice: 0.006 }],
        enteredBy: librarian,
        enteredAt: '2026-11-04T08:00:00.000Z',
        version: 1,
      },
    ],
    approvalHistory: [
      {
        from: 'approved',
        to: 'preferred',
        reason: 'First choice.',
        changedBy: { id: 9, name: 'A. Quist' },
        changedAt: '2026-02-10T15:00:00.000Z',
      },
    ],
    supplyHistory: [],
    openReviews: [],
    declarations: [],
    certificates: [],
    ...rest,
  };
}
