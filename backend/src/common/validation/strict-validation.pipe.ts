import { type ArgumentMetadata, Injectable, ValidationPipe } from '@nestjs/common';
import { MalformedProblem } from '../problems/problems';
import { fieldErrors } from './field-errors';
import { unusableValues } from './refuse-unusable-values';

/**
 * Lets only what a DTO declares come in: unknown fields, nulls, non-finite numbers and wrong types are refused with
 * a pointer to each, and nothing is converted silently.
 */
@Injectable()
export class StrictValidationPipe extends ValidationPipe {
  constructor() {
    super({
      whitelist: true,
      forbidNonWhitelisted: true,
      forbidUnknownValues: true,
      transform: true,
      transformOptions: { enableImplicitConversion: false, exposeUnsetFields: false },
      exceptionFactory: (faults) => new MalformedProblem(fieldErrors(faults)),
    });
  }

  override async transform(value: unknown, metadata: ArgumentMetadata): Promise<unknown> {
    if (metadata.type === 'custom') return value;
    const errors = unusableValues(value);
    if (errors.length > 0) throw new MalformedProblem(errors);
    // The route's own pipe reads a parameter of the path; the parent would take 0x1 and 1e0 for numbers before it does.
    if (metadata.type === 'param' && metadata.data !== undefined) return value;
    if (metadata.type !== 'body' || metadata.metatype === undefined || metadata.metatype === Object) {
      return super.transform(value, metadata);
    }
    if (value !== undefined && (typeof value !== 'object' || Array.isArray(value))) {
      throw new MalformedProblem([{ pointer: '', message: 'must be a JSON object' }]);
    }
    return super.transform(value ?? {}, metadata);
  }
}
