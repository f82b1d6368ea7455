import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { IsOptional, IsString, Matches, MaxLength } from 'class-validator';

const LONGEST = 1000;
const SAYS_SOMETHING = /^(?:[^\p{Cc}]|[\t\n\r])*[^\s\p{Cc}](?:[^\p{Cc}]|[\t\n\r])*$/u;

/** Sentences that people write, of several lines if need be: a reason, the words of a restriction. */
export function Prose(options: { optional?: boolean; description?: string } = {}): PropertyDecorator {
  const { optional, description } = options;
  return applyDecorators(
    ApiProperty({ type: String, maxLength: LONGEST, required: optional !== true, description }),
    ...(optional === true ? [IsOptional()] : []),
    IsString(),
    MaxLength(LONGEST),
    Matches(SAYS_SOMETHING, {
      message: '$property must say something, and must not contain control characters',
    }),
  );
}
