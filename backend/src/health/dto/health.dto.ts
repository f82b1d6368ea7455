import { ApiProperty } from '@nestjs/swagger';

export class Health {
  @ApiProperty({ enum: ['ok'] })
  status: 'ok';

  @ApiProperty({ description: 'The newest migration of the database' })
  schema: string;
}
