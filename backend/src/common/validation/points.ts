import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { IsOptional, registerDecorator, type ValidationArguments } from 'class-validator';

/** A curve as a list of pairs of numbers, at most 1000 of them. */
export function isPoints(value: unknown, atMost = 1000): value is [number, number][] {
  return (
    Array.isArray(value) &&
    value.length > 0 &&
    value.length <= atMost &&
    value.every(
      (point) =>
        Array.isArray(point) && point.length === 2 && point.every((part) => typeof part === 'number'),
    )
  );
}

/** A field that holds a curve: `[[x, y], …]`. */
export function Points(options: {
  optional?: boolean;
  orNumber?: boolean;
  atMost?: number;
  description: string;
}): PropertyDecorator {
  const list = {
    type: 'array',
    items: { type: 'array', items: { type: 'number' }, minItems: 2, maxItems: 2 },
  } as const;
  return applyDecorators(
    ApiProperty({
      required: options.optional !== true,
      description: options.description,
      ...(options.orNumber === true ? { oneOf: [list, { type: 'number' }] } : list),
    }),
    ...(options.optional === true ? [IsOptional()] : []),
    (target: object, property: string | symbol) => {
      registerDecorator({
        name: 'points',
        target: target.constructor,
        propertyName: String(property),
        validator: {
          validate: (value: unknown) =>
            (options.orNumber === true && typeof value === 'number') || isPoints(value, options.atMost),
          defaultMessage: (fault?: ValidationArguments) =>
            `${fault?.property ?? ''} must be a list of pairs of numbers such as [[70, 1], [155, 0]]`,
        },
      });
    },
  );
}
