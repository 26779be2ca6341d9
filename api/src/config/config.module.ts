import { Global, Module } from '@nestjs/common';
import { ENVIRONMENT } from '../common/environment.token';
import { readEnvironment } from './environment';
import { loggingModule } from './logging';

@Global()
@Module({
  imports: [loggingModule],
  providers: [{ provide: ENVIRONMENT, useFactory: () => readEnvironment(process.env) }],
  exports: [ENVIRONMENT],
})
export class ConfigModule {}
