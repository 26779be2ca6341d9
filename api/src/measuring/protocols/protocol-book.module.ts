import { Module } from '@nestjs/common';
import { ProtocolBook } from './protocol-book';

/** The book alone: garments count by it, the measuring room measures by it, publishing freezes it. */
@Module({ providers: [ProtocolBook], exports: [ProtocolBook] })
export class ProtocolBookModule {}
