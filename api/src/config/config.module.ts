import { Global, Module } from '@nestjs/common';
import { ENVIRONMENT } from '../common/environment.token';
import { readEnvironment } from './environment';

@Global()
@Module({
  providers: [{ provide: ENVIRONMENT, useFactory: () => readEnvironment(process.env) }],
  exports: [ENVIRONMENT],
})
export class ConfigModule {}
