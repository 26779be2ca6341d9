import { Injectable } from '@nestjs/common';

/** Whether this process still takes new work. */
@Injectable()
export class Lifecycle {
  private ending = false;

  /** From the first signal to stop: not ready any more, so that balancers look elsewhere. */
  get isEnding(): boolean {
    return this.ending;
  }

  end(): void {
    this.ending = true;
  }
}
