import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { IsNumber, IsOptional, Max, Min } from 'class-validator';

/** What a number field holds: its unit in words for the API's reader, and the bounds outside which it is no such quantity. */
export interface QuantityOptions {
  description: string;
  optional?: boolean;
  min?: number;
  max?: number;
}

/** A number with a unit. */
export function QuantityOf(options: QuantityOptions): PropertyDecorator {
  const { description, optional, min, max } = options;
  return applyDecorators(
    ApiProperty({ type: Number, description, required: optional !== true, minimum: min, maximum: max }),
    ...(optional === true ? [IsOptional()] : []),
    IsNumber(),
    ...(min === undefined ? [] : [Min(min)]),
    ...(max === undefined ? [] : [Max(max)]),
  );
}
