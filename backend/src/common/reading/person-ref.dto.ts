import { ApiProperty } from '@nestjs/swagger';

/** Somebody who did something. */
export class PersonRefDto {
  @ApiProperty()
  id: number;

  @ApiProperty()
  name: string;
}
