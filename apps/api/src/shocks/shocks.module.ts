import { Module } from '@nestjs/common';

import { CatalogueService } from './catalogue.service.js';
import { StorefrontController } from './storefront.controller.js';
import { StorefrontService } from './storefront.service.js';

@Module({
  controllers: [StorefrontController],
  providers: [CatalogueService, StorefrontService],
  exports: [CatalogueService],
})
export class ShocksModule {}
