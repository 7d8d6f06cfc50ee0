import { Controller, Get, Inject } from '@nestjs/common';
import { DiscoveryService, MetadataScanner } from '@nestjs/core';

import { cookieName } from '../../auth/session.middleware.js';
import { CONFIG, type Config } from '../../config/config.js';
import { Public } from '../access/access.js';
import { openApiDocument } from './openapi-document.js';
import { describeRoutes } from './routes.js';

@Controller('openapi.json')
export class OpenApiController {
  private document: object | null = null;

  constructor(
    private readonly discovery: DiscoveryService,
    private readonly scanner: MetadataScanner,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  @Get()
  @Public()
  read(): object {
    this.document ??= openApiDocument(describeRoutes(this.discovery, this.scanner), {
      url: this.config.PUBLIC_URL,
      cookie: cookieName(this.config),
    });
    return this.document;
  }
}
