import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { CATALOGUE } from '../common/catalogue-connection';
import { ENVIRONMENT } from '../common/environment.token';
import type { Environment } from '../config/environment';
import { catalogueConnection, workroomConnection } from './connections';

/** Two connections, two accounts: the Workroom's, and one that may only read what is published. */
@Module({
  imports: [
    TypeOrmModule.forRootAsync({
      inject: [ENVIRONMENT],
      useFactory: (environment: Environment) => workroomConnection(environment),
    }),
    TypeOrmModule.forRootAsync({
      name: CATALOGUE,
      inject: [ENVIRONMENT],
      useFactory: (environment: Environment) => catalogueConnection(environment),
    }),
  ],
})
export class DatabaseModule {}
