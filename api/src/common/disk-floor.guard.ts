import { type CanActivate, type ExecutionContext, Injectable } from '@nestjs/common';
import type { Request } from 'express';
import { Disk } from './disk';
import { isReading } from './origin.guard';
import { Refusal } from './refusal';

/** Refuses to write before the disk is full: a full one can stop the database in the middle of a write. */
@Injectable()
export class DiskFloorGuard implements CanActivate {
  constructor(private readonly disk: Disk) {}

  async canActivate(context: ExecutionContext): Promise<boolean> {
    const request = context.switchToHttp().getRequest<Request>();
    // Signing in and out is little, and whoever is to make room must be able to.
    if (isReading(request) || request.path.startsWith('/api/v1/session')) return true;
    if ((await this.disk.state()) === 'enough') return true;
    throw new Refusal(507, 'disk.full', 'The disk is nearly full: nothing can be saved until there is room.');
  }
}
