import { type ArgumentMetadata, Injectable, type PipeTransform } from '@nestjs/common';
import { MalformedProblem } from '../problems/problems';

/** A whole positive number in the path: `@Param('id', IdentifierPipe) id: number`. */
@Injectable()
export class IdentifierPipe implements PipeTransform<string, number> {
  transform(text: string, metadata: ArgumentMetadata): number {
    const id = Number(text);
    if (!/^[1-9]\d{0,15}$/.test(text) || !Number.isSafeInteger(id)) {
      throw new MalformedProblem([
        { pointer: `/${metadata.data ?? 'id'}`, message: 'must be a whole positive number' },
      ]);
    }
    return id;
  }
}
