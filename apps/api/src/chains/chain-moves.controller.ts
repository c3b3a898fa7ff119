import { Body, Controller, HttpCode, Param, Post, SerializeOptions } from '@nestjs/common';
import { boxChain, chain, fitChain, id, retireChain } from '@halfpitch/contracts';
import type { Chain, FitChain, RetireChain } from '@halfpitch/contracts';
import { Who } from '../common/actor';
import type { Actor } from '../common/actor';
import { Permit } from '../common/permit';
import { ChainsService } from './chains.service';

/** Onto a bike, into the box, out of service and back. */
@Controller('chains/:id')
export class ChainMovesController {
  constructor(private readonly chains: ChainsService) {}

  @Post('fit')
  @HttpCode(200)
  @Permit('bikes.write')
  @SerializeOptions({ schema: chain })
  fit(
    @Who() actor: Actor,
    @Param('id', { schema: id }) chainId: string,
    @Body({ schema: fitChain }) input: FitChain,
  ): Promise<Chain> {
    return this.chains.fit(actor, chainId, input);
  }

  @Post('box')
  @HttpCode(200)
  @Permit('bikes.write')
  @SerializeOptions({ schema: chain })
  box(
    @Who() actor: Actor,
    @Param('id', { schema: id }) chainId: string,
    @Body({ schema: boxChain }) { day }: { day: string },
  ): Promise<Chain> {
    return this.chains.box(actor, chainId, day);
  }

  @Post('retire')
  @HttpCode(200)
  @Permit('bikes.write')
  @SerializeOptions({ schema: chain })
  retire(
    @Who() actor: Actor,
    @Param('id', { schema: id }) chainId: string,
    @Body({ schema: retireChain }) input: RetireChain,
  ): Promise<Chain> {
    return this.chains.retire(actor, chainId, input);
  }

  @Post('return')
  @HttpCode(200)
  @Permit('bikes.write')
  @SerializeOptions({ schema: chain })
  return(@Who() actor: Actor, @Param('id', { schema: id }) chainId: string): Promise<Chain> {
    return this.chains.return(actor, chainId);
  }
}
