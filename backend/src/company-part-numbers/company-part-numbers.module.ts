import { Module } from '@nestjs/common';
import { PartReadingModule } from '../parts/summary/part-reading.module';
import { CompanyPartNumbersController } from './company-part-numbers.controller';
import { CompanyPartNumbersService } from './company-part-numbers.service';

@Module({
  imports: [PartReadingModule],
  controllers: [CompanyPartNumbersController],
  providers: [CompanyPartNumbersService],
})
export class CompanyPartNumbersModule {}
