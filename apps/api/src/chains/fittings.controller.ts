import { Body, Controller, Delete, Get, Param, Put, Query, SerializeOptions } from '@nestjs/common';
import { done, fitting, fittingInput, fittingPage, id, pageQuery } from '@halfpitch/contracts';
import type { Done, Fitting, FittingInput, Page, PageQuery } from '@halfpitch/contracts';
import { Who } from '../common/actor';
import type { Actor } from '../common/actor';
import { Permit } from '../common/permit';
import { FittingHistoryService } from './fitting-history.service';

@Controller()
export class FittingsController {
  constructor(private readonly history: FittingHistoryService) {}

  @Get('chains/:id/fittings')
  @Permit('bikes.read')
  @SerializeOptions({ schema: fittingPage })
  list(
    @Who() actor: Actor,
    @Param('id', { schema: id }) chainId: string,
    @Query({ schema: pageQuery }) page: PageQuery,
  ): Promise<Page<Fitting>> {
    return this.history.list(actor, chainId, page);
  }

  @Put('fittings/:id')
  @Permit('bikes.write')
  @SerializeOptions({ schema: fitting })
  correct(
    @Who() actor: Actor,
    @Param('id', { schema: id }) fittingId: string,
    @Body({ schema: fittingInput }) input: FittingInput,
  ): Promise<Fitting> {
    return this.history.correct(actor, fittingId, input);
  }

  @Delete('fittings/:id')
  @Permit('bikes.write')
  @SerializeOptions({ schema: done })
  remove(@Who() actor: Actor, @Param('id', { schema: id }) fittingId: string): Promise<Done> {
    return this.history.remove(actor, fittingId).then(() => ({ done: true }));
  }
}
