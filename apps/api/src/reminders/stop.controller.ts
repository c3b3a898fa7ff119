import { Body, Controller, Get, HttpCode, Param, Post, SerializeOptions } from '@nestjs/common';
import { stopChange, stopView } from '@halfpitch/contracts';
import type { StopChange, StopView } from '@halfpitch/contracts';
import { Public } from '../common/permit';
import { StopService } from './stop.service';

/** The address in every letter's List-Unsubscribe header: mail programs post to it with one click (RFC 8058). */
@Controller('stop/:token')
export class StopController {
  constructor(private readonly stop: StopService) {}

  @Get()
  @Public()
  @SerializeOptions({ schema: stopView })
  view(@Param('token') token: string): Promise<StopView> {
    return this.stop.view(token);
  }

  @Post()
  @HttpCode(200)
  @Public()
  @SerializeOptions({ schema: stopView })
  set(@Param('token') token: string, @Body({ schema: stopChange }) { on }: StopChange): Promise<StopView> {
    return this.stop.set(token, on);
  }
}
