import { Body, Controller, Get, Put, SerializeOptions } from '@nestjs/common';
import { workshopSettings } from '@halfpitch/contracts';
import type { WorkshopSettings } from '@halfpitch/contracts';
import { Who } from '../common/actor';
import type { Actor } from '../common/actor';
import { Permit } from '../common/permit';
import { WorkshopService } from './workshop.service';

@Controller('workshop')
export class WorkshopController {
  constructor(private readonly workshop: WorkshopService) {}

  @Get()
  @Permit('estimates.read')
  @SerializeOptions({ schema: workshopSettings })
  read(@Who() { workshopId }: Actor): Promise<WorkshopSettings> {
    return this.workshop.read(workshopId);
  }

  @Put()
  @Permit('workshop.write')
  @SerializeOptions({ schema: workshopSettings })
  change(
    @Who() { workshopId }: Actor,
    @Body({ schema: workshopSettings }) input: WorkshopSettings,
  ): Promise<WorkshopSettings> {
    return this.workshop.change(workshopId, input);
  }
}
