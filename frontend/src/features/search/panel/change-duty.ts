import type { DutyText } from '../duty/duty-text';

export type ChangeDuty = (change: (duty: DutyText) => DutyText) => void;
