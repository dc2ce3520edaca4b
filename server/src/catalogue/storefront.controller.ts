import { Body, Controller, Get, HttpCode, Param, Post, Query } from '@nestjs/common';
import { Public } from '../platform/auth/access.js';
import {
  BasketDto,
  DestinationQuery,
  QuoteDto,
  ShopFrontDto,
  ShopListingsDto,
  ShopProductDto,
} from './storefront.dto.js';
import { StorefrontService } from './storefront.service.js';

/** What anybody may see of the shop. */
@Controller('shop')
@Public()
export class StorefrontController {
  constructor(private readonly storefront: StorefrontService) {}

  /** Who the shop is, and where it delivers. */
  @Get()
  async front(): Promise<ShopFrontDto> {
    return this.storefront.front();
  }

  @Get('listings')
  async list(@Query() query: DestinationQuery): Promise<ShopListingsDto> {
    return this.storefront.list(query);
  }

  @Get('listings/:slug')
  async product(@Param('slug') slug: string, @Query() query: DestinationQuery): Promise<ShopProductDto> {
    return this.storefront.product(slug, query);
  }

  /** Prices a basket; claims nothing. */
  @Post('quotes')
  @HttpCode(200)
  async quote(@Body() basket: BasketDto): Promise<QuoteDto> {
    return this.storefront.quote(basket);
  }
}
