import { Controller, Get, HttpCode, Param, Post } from '@nestjs/common';
import {
  ApiConflictResponse,
  ApiCreatedResponse,
  ApiNotFoundResponse,
  ApiOkResponse,
  ApiOperation,
  ApiTags,
} from '@nestjs/swagger';
import { ProblemDocument } from '../common/problems/problem-document';
import { CurrentPerson } from '../permissions/current-person.decorator';
import { May } from '../permissions/may.decorator';
import { Person } from '../permissions/person';
import type { BackupManifest } from './backup-manifest';
import { BackupsService, bytesOf } from './backups.service';
import { BackupCheck, BackupDetails, BackupList } from './dto/backup.dto';

@ApiTags('backups')
@Controller('backups')
export class BackupsController {
  constructor(private readonly backups: BackupsService) {}

  @Get()
  @May('manage', 'Backup')
  @ApiOperation({ operationId: 'listBackups', summary: 'The backups, newest first' })
  @ApiOkResponse({ type: BackupList })
  async list(): Promise<BackupList> {
    const items = (await this.backups.list()).map(({ name, manifest }) =>
      manifest ? { name, details: present(manifest) } : { name },
    );
    return { items };
  }

  @Post()
  @May('manage', 'Backup')
  @ApiOperation({ operationId: 'takeBackup', summary: 'Take a backup now' })
  @ApiCreatedResponse({ type: BackupDetails })
  @ApiConflictResponse({ type: ProblemDocument })
  async take(@CurrentPerson() person: Person): Promise<BackupDetails> {
    return present(await this.backups.take(person, 'on-demand'));
  }

  @Post(':name/check')
  @May('manage', 'Backup')
  @HttpCode(200)
  @ApiOperation({ operationId: 'checkBackup', summary: 'Whether a backup is whole and can be restored' })
  @ApiOkResponse({ type: BackupCheck })
  @ApiNotFoundResponse({ type: ProblemDocument })
  async check(@Param('name') name: string, @CurrentPerson() person: Person): Promise<BackupCheck> {
    const faults = await this.backups.check(person, name);
    return { sound: faults.length === 0, faults };
  }
}

function present(manifest: BackupManifest): BackupDetails {
  const { name, createdAt, reason, schema, files } = manifest;
  return { name, createdAt, reason, schema, files: files.length, bytes: bytesOf(manifest) };
}
