import { Injectable } from '@nestjs/common';

/** What time it is; tests hand in a clock of their own. */
@Injectable()
export class Clock {
  now(): Date {
    return new Date();
  }
}
