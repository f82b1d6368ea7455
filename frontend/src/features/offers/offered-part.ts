import type { Schema } from '../../api/schema';

/** What offers need of a part. */
export type OfferedPart = Pick<
  Schema<'PartDetailsDto'>,
  'id' | 'manufacturerPartNumber' | 'orderingCodes' | 'offers'
>;
