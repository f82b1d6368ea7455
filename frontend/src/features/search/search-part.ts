import type { Approval, Mounting, SupplyStatus, Technology } from '@resistry/engineering/ratings/technology';
import type { AnsweredCheck } from '../../components/assessment/answered-assessment';
import type { BodyStyle } from '../../components/drawn-part/drawn-body';

interface Named {
  id: number;
  code: string;
  name: string;
}

/** A part as lists show it. SI values; what is absent is not stated by the datasheet. */
export interface SearchPart {
  id: number;
  manufacturerPartNumber: string;
  companyPartNumber?: { id: number; number: string };
  manufacturer: Named;
  family: Named;
  technology: Technology;
  size: { id: number; code: string; metricCode?: string };
  bodyStyle: BodyStyle;
  /** m */
  body?: { length: number; width: number; height: number };
  mounting?: Mounting;
  /** Ω; 0 for a zero-ohm link. */
  resistance: number;
  tolerance?: number;
  tcr?: number;
  ratedDissipation?: number;
  approval: Approval;
  supply: SupplyStatus;
  /** € a piece at 1,000, the lowest of the offers in force. */
  unitPrice?: number;
  secondSource: boolean;
}

/** The company's number, or the manufacturer's where it has none. */
export const leadingNumber = (part: SearchPart): string =>
  part.companyPartNumber?.number ?? part.manufacturerPartNumber;

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
