import { Module } from '@nestjs/common';
import { PoliciesModule } from '../policies/policies.module';
import { AssessmentsController } from './assessments.controller';

@Module({ imports: [PoliciesModule], controllers: [AssessmentsController] })
export class AssessmentsModule {}
