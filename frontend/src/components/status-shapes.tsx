import type { Status } from '@resistry/engineering/checks/check';
import type { Approval, SupplyStatus } from '@resistry/engineering/ratings/technology';
import type { ReactNode } from 'react';

const diamond = 'M6 0.8 11.2 6 6 11.2 0.8 6Z';
const outline = { fill: 'none', stroke: 'currentColor', strokeWidth: 1.3 } as const;

/** Shapes differ as well as colours, so that no state is told by colour alone. */
export const approvalShapes: Record<Approval, ReactNode> = {
  preferred: <path d={diamond} fill="currentColor" />,
  approved: <path d={diamond} {...outline} />,
  'in-review': (
    <>
      <path d={diamond} {...outline} />
      <path d="M6 0.8V11.2L0.8 6Z" fill="currentColor" />
    </>
  ),
  draft: <path d={diamond} {...outline} strokeDasharray="1.6 1.6" />,
  restricted: (
    <>
      <path d={diamond} {...outline} />
      <path d="M3.4 6H8.6" stroke="currentColor" strokeWidth={1.6} />
    </>
  ),
  withdrawn: (
    <>
      <path d={diamond} {...outline} />
      <path d="M1.5 10.5 10.5 1.5" stroke="currentColor" strokeWidth={1.3} />
    </>
  ),
};

export const supplyShapes: Record<SupplyStatus, ReactNode> = {
  active: <circle cx={6} cy={6} r={4} fill="currentColor" />,
  'not-recommended': (
    <>
      <circle cx={6} cy={6} r={4} {...outline} />
      <path d="M6 2A4 4 0 0 1 6 10Z" fill="currentColor" />
    </>
  ),
  'last-time-buy': (
    <>
      <circle cx={6} cy={6} r={4.4} {...outline} />
      <path d="M6 3.4V6H8.2" {...outline} />
    </>
  ),
  discontinued: (
    <>
      <circle cx={6} cy={6} r={4} {...outline} />
      <path d="M3.2 8.8 8.8 3.2" stroke="currentColor" strokeWidth={1.3} />
    </>
  ),
};

export const verdictShapes: Record<Status, ReactNode> = {
  met: <path d="M1.4 6.4 4.6 9.6 10.8 2.6" {...outline} strokeWidth={1.8} />,
  unmet: <path d="M2.2 2.2 9.8 9.8M9.8 2.2 2.2 9.8" {...outline} strokeWidth={1.8} />,
  unrated: (
    <>
      <rect x={1} y={2.5} width={10} height={7} {...outline} />
      <path d="M2 9.3 6.5 2.7M5.5 9.3 10 2.7" stroke="currentColor" strokeWidth={1} />
    </>
  ),
};
