import { applyDecorators } from '@nestjs/common';
import { ApiPropertyOptional } from '@nestjs/swagger';
import { ArrayMaxSize, IsArray, IsBoolean, IsIn, IsInt, IsNumber, IsOptional, Min } from 'class-validator';

/** A filter by names of a closed list, any of which is accepted. */
export function AnyOf(names: readonly string[], description?: string): PropertyDecorator {
  return applyDecorators(
    ApiPropertyOptional({ enum: names, isArray: true, description }),
    IsOptional(),
    IsArray(),
    ArrayMaxSize(names.length),
    IsIn(names, { each: true }),
  );
}

/** A filter by ids, any of which is accepted. */
export function AnyId(): PropertyDecorator {
  return applyDecorators(
    ApiPropertyOptional({ type: [Number] }),
    IsOptional(),
    IsArray(),
    ArrayMaxSize(500),
    IsInt({ each: true }),
    Min(1, { each: true }),
  );
}

/** A filter by numbers as they are printed, any of which is accepted. */
export function AnyNumber(description: string): PropertyDecorator {
  return applyDecorators(
    ApiPropertyOptional({ type: [Number], description }),
    IsOptional(),
    IsArray(),
    ArrayMaxSize(100),
    IsNumber({}, { each: true }),
  );
}

/** A filter by whether something is so. */
export function Whether(description: string): PropertyDecorator {
  return applyDecorators(ApiPropertyOptional({ description }), IsOptional(), IsBoolean());
}
