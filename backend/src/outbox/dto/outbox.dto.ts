import { ApiProperty } from '@nestjs/swagger';

export class UndeliveredMessage {
  @ApiProperty()
  id: string;

  @ApiProperty({ description: 'Topic, such as mail' })
  kind: string;

  @ApiProperty({
    enum: ['pending', 'dead'],
    description: 'dead: given up, until somebody asks for another attempt',
  })
  state: 'pending' | 'dead';

  @ApiProperty()
  attempts: number;

  @ApiProperty({ description: 'ISO 8601' })
  createdAt: string;

  @ApiProperty({ description: 'ISO 8601' })
  nextAttemptAt: string;

  @ApiProperty({ required: false })
  lastError?: string;
}

export class UndeliveredMessages {
  @ApiProperty({ type: [UndeliveredMessage], description: 'The oldest 200' })
  items: UndeliveredMessage[];
}
