import { Body, Controller, Get, HttpCode, Param, Post, SerializeOptions } from '@nestjs/common';
import { stopChange, stopView } from '@halfpitch/contracts';
import type { StopChange, StopView } from '@halfpitch/contracts';
import { Public } from '../common/permit';
import { StopService } from './stop.service';

@Controller('stop/:token')
export class StopController {
  constructor(private readonly stop: StopService) {}

  @Get()
  @Public()
  @SerializeOptions({ schema: stopView })
  read(@Param('token') token: string): Promise<StopView> {
    return this.stop.read(token);
  }

  @Post()
  @HttpCode(200)
  @Public()
  @SerializeOptions({ schema: stopView })
  change(@Param('token') token: string, @Body({ schema: stopChange }) { on }: StopChange): Promise<StopView> {
    return this.stop.change(token, on);
  }
}
