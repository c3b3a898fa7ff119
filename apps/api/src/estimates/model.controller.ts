import { Controller, Get, SerializeOptions } from '@nestjs/common';
import { estimationModel } from '@halfpitch/contracts';
import type { EstimationModel } from '@halfpitch/contracts';
import { Who } from '../common/actor';
import type { Actor } from '../common/actor';
import { Permit } from '../common/permit';
import { EstimatesService } from './estimates.service';

@Controller('model')
export class ModelController {
  constructor(private readonly estimates: EstimatesService) {}

  @Get()
  @Permit('estimates.read')
  @SerializeOptions({ schema: estimationModel })
  read(@Who() actor: Actor): Promise<EstimationModel> {
    return this.estimates.model(actor);
  }
}
