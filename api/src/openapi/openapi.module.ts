import { Module } from '@nestjs/common';
import { OpenApiController } from './openapi.controller';
import { OpenApi } from './openapi.service';

@Module({ controllers: [OpenApiController], providers: [OpenApi] })
export class OpenApiModule {}
