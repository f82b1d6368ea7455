import { ApiProperty, ApiPropertyOptional, getSchemaPath } from '@nestjs/swagger';
import type { Assessment } from '@resistry/engineering/assessment/assess';
import { checkNames, type CheckName, type CheckUnit, type Status } from '@resistry/engineering/checks/check';
import type { Contribution } from '@resistry/engineering/budget/budget';
import { BasisDto } from './basis.dto';

const statuses = ['met', 'unmet', 'unrated'] as const;

/** One line of an assessment. */
export class CheckResultDto {
  @ApiProperty({ enum: checkNames })
  check: CheckName;

  @ApiProperty({
    type: Number,
    nullable: true,
    description: 'In the unit; null for yes-or-no checks and where not known',
  })
  demand: number | null;

  @ApiProperty({ type: Number, nullable: true })
  allowance: number | null;

  @ApiProperty({
    enum: ['1', 'W', 'V', '°C', 'A', 'Ω', 'm', ''],
    description: "'1' is a fraction, '' a yes-or-no check",
  })
  unit: CheckUnit;

  @ApiProperty({ type: Number, nullable: true, description: 'allowance / demand − 1' })
  margin: number | null;

  @ApiProperty({ enum: statuses })
  status: Status;

  @ApiProperty({ type: [String], description: 'Data that are missing for a full answer' })
  missing: readonly string[];

  @ApiProperty({ type: BasisDto })
  basis: BasisDto;
}

/** One contribution of the deviation budget. */
export class BudgetLineDto {
  @ApiProperty({ enum: ['tolerance', 'temperature', 'voltage', 'soldering', 'humidity', 'pulse', 'drift'] })
  contribution: Contribution;

  @ApiProperty({
    type: Number,
    nullable: true,
    description: 'Fraction of the nominal; null where data are missing',
  })
  amount: number | null;

  @ApiProperty()
  basis: string;

  @ApiProperty({ type: [String] })
  missing: readonly string[];
}

/** What the part could bear here at its nominal. */
export class PermittedDto {
  @ApiProperty({ type: Number, nullable: true, description: 'W' })
  dissipation: number | null;

  @ApiProperty({ type: Number, nullable: true, description: 'V' })
  voltage: number | null;

  @ApiProperty({ type: Number, nullable: true, description: 'A' })
  current: number | null;
}

/** A caution that the numbers call for. */
export class CautionDto {
  @ApiProperty()
  kind: string;

  @ApiProperty()
  title: string;

  @ApiProperty()
  text: string;
}

/** Where deviation, dissipation and temperature settled. */
export class OperatingDto {
  @ApiProperty({ description: 'Lowest resistance over life, Ω' })
  low: number;

  @ApiProperty({ description: 'Highest resistance over life, Ω' })
  high: number;

  @ApiProperty({ description: 'W' })
  dissipation: number;

  @ApiProperty({ type: Number, nullable: true, description: 'Hottest element, °C; null where not known' })
  elementTemperature: number | null;

  @ApiProperty({ description: 'Steps of the iteration' })
  steps: number;
}

/** The version of the derating policy an assessment was made under. */
export class PolicyVersionRefDto {
  @ApiProperty({ description: 'Id of the version' })
  id: number;

  @ApiProperty({ description: 'Number of the version within its policy' })
  version: number;

  @ApiProperty({ description: 'Name of the policy' })
  name: string;
}

export type PolicyUsed = PolicyVersionRefDto | 'none' | 'inline';

/** One part held against one duty. */
export class AssessmentDto {
  @ApiProperty({ enum: statuses })
  verdict: Status;

  @ApiProperty({ type: [CheckResultDto] })
  checks: CheckResultDto[];

  @ApiProperty({ type: [BudgetLineDto] })
  budget: BudgetLineDto[];

  @ApiProperty({ type: PermittedDto })
  permitted: PermittedDto;

  @ApiProperty({
    type: 'object',
    additionalProperties: { type: 'number' },
    description: 'By check, how many times its rating passes its demand',
  })
  excess: Assessment['excess'];

  @ApiProperty({ type: [CautionDto] })
  cautions: CautionDto[];

  @ApiPropertyOptional({ type: OperatingDto, description: 'Absent for a link and where nothing settles' })
  operating?: OperatingDto;

  @ApiPropertyOptional({ description: 'Operating mode used, where the size has several' })
  mode?: string;

  @ApiProperty({
    oneOf: [{ $ref: getSchemaPath(PolicyVersionRefDto) }, { type: 'string', enum: ['none', 'inline'] }],
  })
  policy: PolicyUsed;

  @ApiProperty({ description: 'What stands on every result' })
  notice: string;
}
