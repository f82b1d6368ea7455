import { Module } from '@nestjs/common';
import { UsersModule } from '../users/users.module';
import { DemonstrationSeed } from './demonstration-seed';

@Module({ imports: [UsersModule], providers: [DemonstrationSeed] })
export class SeedModule {}
