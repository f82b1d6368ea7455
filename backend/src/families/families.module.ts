import { Module } from '@nestjs/common';
import { FamiliesController } from './families.controller';
import { FamilyList } from './family-list';
import { FamilyPage } from './family-page';
import { FamilyPapers } from './family-papers';
import { FamilyRevisions } from './family-revisions';
import { OrderingCodeExamples } from './ordering-code-examples';

@Module({
  controllers: [FamiliesController],
  providers: [FamilyList, FamilyPage, FamilyPapers, FamilyRevisions, OrderingCodeExamples],
  exports: [FamilyPapers],
})
export class FamiliesModule {}
