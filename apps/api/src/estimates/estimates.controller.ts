import { Controller, Get, Param, Query, SerializeOptions } from '@nestjs/common';
import { chainEstimate, id, pastEstimatePage, pastEstimateQuery, usage } from '@halfpitch/contracts';
import type { ChainEstimate, Page, PastEstimate, PastEstimateQuery, Usage } from '@halfpitch/contracts';
import { Who } from '../common/actor';
import type { Actor } from '../common/actor';
import { Permit } from '../common/permit';
import { EstimatesService } from './estimates.service';
import { UsageService } from './usage.service';

@Controller('chains/:id')
export class EstimatesController {
  constructor(
    private readonly estimates: EstimatesService,
    private readonly usages: UsageService,
  ) {}

  @Get('estimate')
  @Permit('estimates.read')
  @SerializeOptions({ schema: chainEstimate })
  current(@Who() actor: Actor, @Param('id', { schema: id }) chainId: string): Promise<ChainEstimate> {
    return this.estimates.current(actor, chainId);
  }

  @Get('estimates')
  @Permit('estimates.read')
  @SerializeOptions({ schema: pastEstimatePage })
  past(
    @Who() actor: Actor,
    @Param('id', { schema: id }) chainId: string,
    @Query({ schema: pastEstimateQuery }) page: PastEstimateQuery,
  ): Promise<Page<PastEstimate>> {
    return this.estimates.past(actor, chainId, page);
  }

  @Get('usage')
  @Permit('estimates.read')
  @SerializeOptions({ schema: usage })
  usage(@Who() actor: Actor, @Param('id', { schema: id }) chainId: string): Promise<Usage> {
    return this.usages.read(actor, chainId);
  }
}
