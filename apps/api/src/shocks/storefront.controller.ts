import {
  shockList,
  shockListQuery,
  shockPage,
  shockSizeList,
  slug,
  storefrontQuery,
  type ShockList,
  type ShockListQuery,
  type ShockPage,
  type ShockSizeList,
  type StorefrontQuery,
} from '@linkfell/contracts';
import { Controller, Get, Param, Query } from '@nestjs/common';

import { Public } from '../common/access/access.js';
import { Answers } from '../common/validation/answers.js';
import { zod } from '../common/validation/zod.pipe.js';
import { StorefrontService } from './storefront.service.js';

@Controller('shocks')
export class StorefrontController {
  constructor(private readonly storefront: StorefrontService) {}

  @Get()
  @Public()
  @Answers(shockList)
  list(@Query(zod(shockListQuery)) query: ShockListQuery): Promise<ShockList> {
    return this.storefront.list(query);
  }

  // Before the page of one shock, whose address it would otherwise be taken for.
  @Get('sizes')
  @Public()
  @Answers(shockSizeList)
  sizes(@Query(zod(storefrontQuery)) query: StorefrontQuery): Promise<ShockSizeList> {
    return this.storefront.sizes(query);
  }

  @Get(':sizeId')
  @Public()
  @Answers(shockPage)
  page(@Param('sizeId', zod(slug)) sizeId: string): Promise<ShockPage> {
    return this.storefront.page(sizeId);
  }
}
