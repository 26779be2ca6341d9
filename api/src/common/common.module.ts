import { Global, Module } from '@nestjs/common';
import { Clock } from './clock';
import { Work } from './work';

@Global()
@Module({ providers: [Clock, Work], exports: [Clock, Work] })
export class CommonModule {}
