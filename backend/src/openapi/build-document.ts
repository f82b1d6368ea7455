import { NestFactory } from '@nestjs/core';
import { DocumentBuilder, type OpenAPIObject, SwaggerModule } from '@nestjs/swagger';
import { AppModule } from '../app.module';
import { ApplicationOptions } from '../config/application-options';
import { readEnvironment } from '../config/environment';

/** Describes the API from its decorators. Nothing is instantiated: no database is opened and no port listened on. */
export async function buildDocument(): Promise<OpenAPIObject> {
  const options = new ApplicationOptions({ logLevel: 'silent' });
  const application = await NestFactory.create(AppModule.with(readEnvironment({}), options), {
    preview: true,
    logger: false,
    abortOnError: false,
  });
  application.setGlobalPrefix('api');
  const description = new DocumentBuilder()
    .setTitle('Resistry')
    .setDescription(
      'Approved resistors, and the desk on which they are chosen. JSON; SI units; problems as RFC 9457.',
    )
    .setVersion('1')
    .addBearerAuth()
    .build();
  return SwaggerModule.createDocument(application, description);
}

/** The document as the file has it: the same text for the same decorators. */
export function documentText(document: OpenAPIObject): string {
  return `${JSON.stringify(document, null, 2)}\n`;
}
