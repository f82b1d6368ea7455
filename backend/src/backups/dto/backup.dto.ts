import { ApiProperty } from '@nestjs/swagger';

export class BackupDetails {
  @ApiProperty({ example: '2026-12-01T02-30-00Z-4f1c' })
  name: string;

  @ApiProperty({ description: 'ISO 8601' })
  createdAt: string;

  @ApiProperty({ enum: ['nightly', 'on-demand'] })
  reason: 'nightly' | 'on-demand';

  @ApiProperty({ description: 'The newest migration in it' })
  schema: string;

  @ApiProperty()
  files: number;

  @ApiProperty()
  bytes: number;
}

export class ListedBackupDetails {
  @ApiProperty({ example: '2026-12-01T02-30-00Z-4f1c' })
  name: string;

  @ApiProperty({ required: false, description: 'Absent where the backup is damaged so that it cannot say' })
  details?: BackupDetails;
}

export class BackupList {
  @ApiProperty({ type: [ListedBackupDetails] })
  items: ListedBackupDetails[];
}

export class BackupCheck {
  @ApiProperty({ description: 'Whether it can be restored' })
  sound: boolean;

  @ApiProperty({ type: [String], description: 'What is wrong with it' })
  faults: string[];
}
