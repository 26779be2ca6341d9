import { type INestApplication, Injectable } from '@nestjs/common';
import { DocumentBuilder, type OpenAPIObject, SwaggerModule } from '@nestjs/swagger';
import { cleanupOpenApiDoc } from 'nestjs-zod';
import { problemResponses } from './problem-responses';

/** The API's description of itself, made from the routes and schemas that it runs with. */
@Injectable()
export class OpenApi {
  private application: INestApplication | undefined;
  private made: OpenAPIObject | undefined;

  describes(application: INestApplication): void {
    this.application = application;
  }

  /** OpenAPI 3.1; made at the first question, since all routes must be there. */
  get document(): OpenAPIObject {
    return (this.made ??= this.make());
  }

  private make(): OpenAPIObject {
    if (!this.application) throw new Error('The description was asked for before there was an application');
    const outline = new DocumentBuilder()
      .setOpenAPIVersion('3.1.0')
      .setTitle('Ellwand')
      .setDescription(
        'A measured catalogue of historic dress, with the workroom behind it. Lengths are exact decimals in ' +
          'millimetres, as strings, in fields that end in `Mm`.',
      )
      .setVersion('1')
      .addCookieAuth('ellwand-access', { type: 'apiKey', in: 'cookie' }, 'session')
      .build();
    const document = SwaggerModule.createDocument(this.application, outline, {
      operationIdFactory: (controller, method) => `${controller.replace(/Controller$/, '')}.${method}`,
    });
    return problemResponses(cleanupOpenApiDoc(document, { version: '3.1' }));
  }
}
