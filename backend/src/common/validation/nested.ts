import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import {
  ArrayMaxSize,
  IsArray,
  IsOptional,
  registerDecorator,
  ValidateNested,
  type ValidationArguments,
} from 'class-validator';

type ClassOf = () => new () => object;

/**
 * A field that holds one object of the given class. `@ValidateNested()` alone lets an empty array pass for an
 * object; this does not.
 */
export function Nested(type: ClassOf, options: { optional?: boolean } = {}): PropertyDecorator {
  return applyDecorators(
    ApiProperty({ type: () => type(), required: options.optional !== true }),
    ...optionally(options),
    IsPlainObject(),
    ValidateNested(),
    Type(type),
  );
}

/** A field that holds a list of objects of the given class, at most `atMost` of them. */
export function NestedList(
  type: ClassOf,
  options: { optional?: boolean; atMost: number },
): PropertyDecorator {
  return applyDecorators(
    ApiProperty({ type: () => [type()], required: options.optional !== true, maxItems: options.atMost }),
    ...optionally(options),
    IsArray(),
    ArrayMaxSize(options.atMost),
    IsPlainObject({ each: true }),
    ValidateNested({ each: true }),
    Type(type),
  );
}

function optionally(options: { optional?: boolean }): PropertyDecorator[] {
  return options.optional ? [IsOptional()] : [];
}

function IsPlainObject(options: { each?: boolean } = {}): PropertyDecorator {
  return (target: object, property: string | symbol) => {
    registerDecorator({
      name: 'isPlainObject',
      target: target.constructor,
      propertyName: String(property),
      options: { each: options.each },
      validator: {
        validate: (value: unknown) => typeof value === 'object' && value !== null && !Array.isArray(value),
        defaultMessage: (fault?: ValidationArguments) =>
          `${fault?.property ?? ''} must ${options.each ? 'hold only objects' : 'be an object'}`,
      },
    });
  };
}
