import { Body, Controller, Delete, Get, Param, Post, Put, Query, SerializeOptions } from '@nestjs/common';
import { chain, chainInput, chainPage, chainQuery, done, id, newChain } from '@halfpitch/contracts';
import type { Chain, ChainInput, ChainQuery, Done, NewChain, Page } from '@halfpitch/contracts';
import { Who } from '../common/actor';
import type { Actor } from '../common/actor';
import { Permit } from '../common/permit';
import { ChainsService } from './chains.service';

@Controller('chains')
export class ChainsController {
  constructor(private readonly chains: ChainsService) {}

  @Get()
  @Permit('bikes.read')
  @SerializeOptions({ schema: chainPage })
  list(@Who() actor: Actor, @Query({ schema: chainQuery }) query: ChainQuery): Promise<Page<Chain>> {
    return this.chains.list(actor, query);
  }

  @Post()
  @Permit('bikes.write')
  @SerializeOptions({ schema: chain })
  create(@Who() actor: Actor, @Body({ schema: newChain }) input: NewChain): Promise<Chain> {
    return this.chains.create(actor, input);
  }

  @Get(':id')
  @Permit('bikes.read')
  @SerializeOptions({ schema: chain })
  read(@Who() actor: Actor, @Param('id', { schema: id }) chainId: string): Promise<Chain> {
    return this.chains.read(actor, chainId);
  }

  @Put(':id')
  @Permit('bikes.write')
  @SerializeOptions({ schema: chain })
  change(
    @Who() actor: Actor,
    @Param('id', { schema: id }) chainId: string,
    @Body({ schema: chainInput }) input: ChainInput,
  ): Promise<Chain> {
    return this.chains.change(actor, chainId, input);
  }

  @Delete(':id')
  @Permit('bikes.write')
  @SerializeOptions({ schema: done })
  remove(@Who() actor: Actor, @Param('id', { schema: id }) chainId: string): Promise<Done> {
    return this.chains.remove(actor, chainId).then(() => ({ done: true }));
  }
}
