import { HttpStatus, RequestMethod } from '@nestjs/common';
import { ModulesContainer } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { ApiResponse, DocumentBuilder, SwaggerModule } from '@nestjs/swagger';
import { problem } from '@halfpitch/contracts';
import type { z } from 'zod';

const TOKENS =
  'A personal token, made under Account. Scopes: read (bikes, chains, rides, readings, estimates), rides:write, ' +
  'readings:write; never accounts or tokens. POST /api/rides with an Idempotency-Key of your own keeps a ride that is ' +
  'sent twice once. At most 1,800 calls in 15 minutes.';

type Handler = (...args: unknown[]) => unknown;

/** What @SerializeOptions, @HttpCode and the method decorators left on a handler. */
const noted = (handler: Handler) => ({
  schema: (Reflect.getMetadata('class_serializer:options', handler) as { schema?: z.ZodType } | undefined)
    ?.schema,
  status: Reflect.getMetadata('__httpCode__', handler) as HttpStatus | undefined,
  method: Reflect.getMetadata('method', handler) as RequestMethod | undefined,
});

/** Every handler's answer is documented by the schema that its answer is held to. */
function documentAnswers(app: NestExpressApplication): void {
  const controllers = [...app.get(ModulesContainer).values()].flatMap((module) => [
    ...module.controllers.values(),
  ]);
  for (const { metatype } of controllers) {
    const prototype = (metatype as { prototype?: object } | null)?.prototype ?? {};
    for (const [name, descriptor] of Object.entries(Object.getOwnPropertyDescriptors(prototype))) {
      if (typeof descriptor.value !== 'function' || name === 'constructor') continue;
      const { schema, status, method } = noted(descriptor.value as Handler);
      if (!schema || method === undefined) continue;
      const usual = method === RequestMethod.POST ? HttpStatus.CREATED : HttpStatus.OK;
      ApiResponse({ status: status ?? usual, description: 'Done.', standardSchema: schema })(
        prototype,
        name,
        descriptor,
      );
    }
  }
}

/** The API's OpenAPI document at /api/docs/openapi.json and a page to browse it at /api/docs, from the same schemas. */
export function mountDocs(app: NestExpressApplication): void {
  const config = new DocumentBuilder()
    .setTitle('Halfpitch')
    .setDescription(
      'Chain wear and drivetrain lubrication: riders, bikes, chains, rides, readings, treatments, estimates.',
    )
    .setVersion('1')
    .addCookieAuth('halfpitch')
    .addBearerAuth({ type: 'http', scheme: 'bearer', description: TOKENS }, 'token')
    .addSecurityRequirements('cookie')
    .addSecurityRequirements('token')
    .addGlobalResponse({
      status: 'default',
      description: 'What went wrong, as problem details (RFC 9457).',
      standardSchema: problem,
    })
    .build();
  const document = () => {
    documentAnswers(app);
    return SwaggerModule.createDocument(app, config);
  };
  SwaggerModule.setup('api/docs', app, document, { jsonDocumentUrl: 'api/docs/openapi.json' });
}
