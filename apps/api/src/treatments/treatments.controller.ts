import { Body, Controller, Delete, Get, Param, Post, Query, SerializeOptions } from '@nestjs/common';
import { done, id, treatment, treatmentInput, treatmentPage, treatmentQuery } from '@halfpitch/contracts';
import type { Done, Page, Treatment, TreatmentInput, TreatmentQuery } from '@halfpitch/contracts';
import { Who } from '../common/actor';
import type { Actor } from '../common/actor';
import { Permit } from '../common/permit';
import { TreatmentsService } from './treatments.service';

@Controller('treatments')
export class TreatmentsController {
  constructor(private readonly treatments: TreatmentsService) {}

  @Get()
  @Permit('bikes.read')
  @SerializeOptions({ schema: treatmentPage })
  list(
    @Who() actor: Actor,
    @Query({ schema: treatmentQuery }) query: TreatmentQuery,
  ): Promise<Page<Treatment>> {
    return this.treatments.list(actor, query);
  }

  @Post()
  @Permit('treatments.write')
  @SerializeOptions({ schema: treatment })
  create(@Who() actor: Actor, @Body({ schema: treatmentInput }) input: TreatmentInput): Promise<Treatment> {
    return this.treatments.create(actor, input);
  }

  @Delete(':id')
  @Permit('treatments.write')
  @SerializeOptions({ schema: done })
  remove(@Who() actor: Actor, @Param('id', { schema: id }) treatmentId: string): Promise<Done> {
    return this.treatments.remove(actor, treatmentId).then(() => ({ done: true }));
  }
}
