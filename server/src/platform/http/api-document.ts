import type { Type } from '@nestjs/common';
import { NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { DocumentBuilder, type OpenAPIObject, SwaggerModule } from '@nestjs/swagger';
import { ProblemDto } from '../errors/problem.dto.js';
import { configureApp } from './configure-app.js';
import { ServerAdapter } from './server.adapter.js';

/** The OpenAPI document of all routes; nothing of the application connects to anything for it. */
export async function createDocument(module: Type): Promise<OpenAPIObject> {
  const app = await NestFactory.create<NestExpressApplication>(module, new ServerAdapter(), {
    abortOnError: false,
    bodyParser: false,
    logger: ['error'],
  });
  configureApp(app);
  await app.init();
  const description = new DocumentBuilder().setTitle('Emberlot').setVersion('1').addGlobalResponse({
    status: 'default',
    description: 'A refusal, as RFC 9457 describes it.',
    type: ProblemDto,
  });
  const document = SwaggerModule.createDocument(app, description.build(), {
    extraModels: [ProblemDto],
    // Method names such as `list` stand in many controllers; with the controller's name they are unique.
    operationIdFactory: (controller, method) => `${controller.replace(/Controller$/, '')}_${method}`,
  });
  await app.close();
  return document;
}
