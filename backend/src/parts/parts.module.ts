import { Module } from '@nestjs/common';
import { PartText } from './part-text';
import { StandingChanges } from './standing-changes';

@Module({
  providers: [PartText, StandingChanges],
  exports: [PartText, StandingChanges],
})
export class PartsModule {}
