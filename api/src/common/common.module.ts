import { Global, Module } from '@nestjs/common';
import { Clock } from './clock';
import { ContentSecurity } from './content-security';
import { defaultLimits, LIMITS } from './limits';
import { Work } from './work';

@Global()
@Module({
  providers: [Clock, ContentSecurity, Work, { provide: LIMITS, useValue: defaultLimits }],
  exports: [Clock, ContentSecurity, Work, LIMITS],
})
export class CommonModule {}
