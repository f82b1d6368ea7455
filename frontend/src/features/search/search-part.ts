import type { Approval, SupplyStatus, Technology } from '@resistry/engineering/ratings/technology';
import type { AnsweredCheck } from '../../components/assessment/answered-assessment';
import type { BodyStyle } from '../../components/drawn-part/drawn-body';

/** A part as a search lists it. SI values; an absent or null one is not stated by the datasheet. */
export interface SearchPart {
  id: number;
  manufacturerPartNumber: string;
  companyPartNumber?: string | null;
  manufacturer: { id: number; name: string };
  family: { id: number; code: string; name: string };
  technology: Technology;
  size: { code: string; metricCode?: string | null };
  body?: { style: BodyStyle; length?: number | null; width?: number | null; height?: number | null } | null;
  /** Ω; 0 for a zero-ohm link. */
  resistance: number;
  tolerance?: number | null;
  tcr?: number | null;
  approval: Approval;
  supply: SupplyStatus;
  /** € a piece at 1,000, the lowest of the offers in force. */
  unitPrice?: number | null;
}

/** The check that leaves least room, which is the one to look at first. */
export function tightestCheck(checks: readonly AnsweredCheck[]): AnsweredCheck | undefined {
  const failing =
    checks.find((check) => check.status === 'unmet') ?? checks.find((check) => check.status === 'unrated');
  if (failing !== undefined) return failing;
  return checks
    .filter((check) => check.margin !== null)
    .reduce<AnsweredCheck | undefined>(
      (least, check) => (least === undefined || (check.margin ?? 0) < (least.margin ?? 0) ? check : least),
      undefined,
    );
}
