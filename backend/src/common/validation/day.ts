import { applyDecorators } from '@nestjs/common';
import { Matches } from 'class-validator';
import { Moment } from './moment';

/** A day as ISO 8601 text without time: `2026-12-01`. */
export function Day(): PropertyDecorator {
  return applyDecorators(
    Matches(/^\d{4}-\d{2}-\d{2}$/, { message: '$property must be a day such as 2026-12-01' }),
    Moment(),
  );
}
