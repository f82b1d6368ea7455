import { type ArgumentMetadata, Injectable, type PipeTransform } from '@nestjs/common';
import { isUUID } from 'class-validator';
import { MalformedProblem } from '../problems/problems';

/** A UUID in the path: `@Param('id', UuidPipe) id: string`. */
@Injectable()
export class UuidPipe implements PipeTransform<string, string> {
  transform(text: string, metadata: ArgumentMetadata): string {
    if (!isUUID(text))
      throw new MalformedProblem([{ pointer: `/${metadata.data ?? 'id'}`, message: 'must be a UUID' }]);
    return text.toLowerCase();
  }
}
