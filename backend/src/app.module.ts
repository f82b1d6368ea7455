import { type DynamicModule, Module } from '@nestjs/common';
import { APP_FILTER, APP_PIPE } from '@nestjs/core';
import { ScheduleModule } from '@nestjs/schedule';
import { AccountModule } from './account/account.module';
import { AssessmentsModule } from './assessments/assessments.module';
import { AuditModule } from './audit/audit.module';
import { AuthModule } from './auth/auth.module';
import { BackupsModule } from './backups/backups.module';
import { LoggingModule } from './common/logging/logging.module';
import { ProblemFilter } from './common/problems/problem.filter';
import { StrictValidationPipe } from './common/validation/strict-validation.pipe';
import type { ApplicationOptions } from './config/application-options';
import { ConfigModule } from './config/config.module';
import type { Environment } from './config/environment';
import { DatabaseModule } from './database/database.module';
import { CompanyPartNumbersModule } from './company-part-numbers/company-part-numbers.module';
import { FacetsModule } from './facets/facets.module';
import { FamiliesModule } from './families/families.module';
import { ManufacturersModule } from './manufacturers/manufacturers.module';
import { OffersModule } from './offers/offers.module';
import { PartsModule } from './parts/parts.module';
import { PoliciesModule } from './policies/policies.module';
import { ReviewsModule } from './reviews/reviews.module';
import { SuppliersModule } from './suppliers/suppliers.module';
import { TextSearchModule } from './text-search/text-search.module';
import { HealthModule } from './health/health.module';
import { HousekeepingModule } from './housekeeping/housekeeping.module';
import { MailModule } from './mail/mail.module';
import { NotationModule } from './notation/notation.module';
import { OutboxModule } from './outbox/outbox.module';
import { PermissionsModule } from './permissions/permissions.module';
import { SearchModule } from './search/search.module';
import { SeedModule } from './seed/seed.module';
import { UsersModule } from './users/users.module';

@Module({})
export class AppModule {
  static with(environment: Environment, options: ApplicationOptions): DynamicModule {
    return {
      module: AppModule,
      imports: [
        ConfigModule.with(environment, options),
        LoggingModule.at(options.logLevel),
        DatabaseModule,
        ScheduleModule.forRoot(),
        AuthModule,
        PermissionsModule,
        AuditModule,
        OutboxModule,
        MailModule,
        UsersModule,
        SeedModule,
        AccountModule,
        BackupsModule,
        HousekeepingModule,
        ManufacturersModule,
        FamiliesModule,
        PartsModule,
        OffersModule,
        SuppliersModule,
        CompanyPartNumbersModule,
        FacetsModule,
        TextSearchModule,
        ReviewsModule,
        PoliciesModule,
        NotationModule,
        AssessmentsModule,
        SearchModule,
        HealthModule,
      ],
      providers: [
        { provide: APP_FILTER, useClass: ProblemFilter },
        { provide: APP_PIPE, useClass: StrictValidationPipe },
      ],
    };
  }
}
