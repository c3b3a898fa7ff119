import { Body, Controller, Delete, Get, Param, Post, Query, SerializeOptions } from '@nestjs/common';
import { apiTokenPage, done, id, madeApiToken, newApiToken, pageQuery } from '@halfpitch/contracts';
import type { ApiToken, Done, MadeApiToken, NewApiToken, Page, PageQuery } from '@halfpitch/contracts';
import { Who } from '../common/actor';
import type { Actor } from '../common/actor';
import { SignedIn } from '../common/permit';
import { ApiTokensService } from './api-tokens.service';

@Controller('account/tokens')
export class ApiTokensController {
  constructor(private readonly tokens: ApiTokensService) {}

  @Get()
  @SignedIn()
  @SerializeOptions({ schema: apiTokenPage })
  list(@Who() actor: Actor, @Query({ schema: pageQuery }) query: PageQuery): Promise<Page<ApiToken>> {
    return this.tokens.list(actor, query);
  }

  @Post()
  @SignedIn()
  @SerializeOptions({ schema: madeApiToken })
  make(@Who() actor: Actor, @Body({ schema: newApiToken }) input: NewApiToken): Promise<MadeApiToken> {
    return this.tokens.make(actor, input);
  }

  @Delete(':id')
  @SignedIn()
  @SerializeOptions({ schema: done })
  revoke(@Param('id', { schema: id }) tokenId: string): Promise<Done> {
    return this.tokens.revoke(tokenId).then(() => ({ done: true }));
  }
}
