import type { NestExpressApplication } from '@nestjs/platform-express';
import { DocumentBuilder, SwaggerModule } from '@nestjs/swagger';

/** The API's OpenAPI document at /api/docs/openapi.json and a page to browse it at /api/docs, from the same schemas. */
export function mountDocs(app: NestExpressApplication): void {
  const config = new DocumentBuilder()
    .setTitle('Halfpitch')
    .setDescription(
      'Chain wear and drivetrain lubrication: riders, bikes, chains, rides, readings, treatments, estimates.',
    )
    .setVersion('1')
    .addCookieAuth('halfpitch')
    .build();
  SwaggerModule.setup('api/docs', app, () => SwaggerModule.createDocument(app, config), {
    jsonDocumentUrl: 'api/docs/openapi.json',
  });
}
