import { Global, Module } from '@nestjs/common';
import { Clock } from './clock';
import { ContentSecurity } from './content-security';
import { Disk } from './disk';
import { Lifecycle } from './lifecycle';
import { defaultLimits, LIMITS } from './limits';
import { Work } from './work';

@Global()
@Module({
  providers: [Clock, ContentSecurity, Disk, Lifecycle, Work, { provide: LIMITS, useValue: defaultLimits }],
  exports: [Clock, ContentSecurity, Disk, Lifecycle, Work, LIMITS],
})
export class CommonModule {}
