import { Body, Controller, Delete, Get, Param, Post, Query, SerializeOptions } from '@nestjs/common';
import { done, id, odometerInput, odometerPage, odometerReading, pageQuery } from '@halfpitch/contracts';
import type { Done, OdometerInput, OdometerReading, Page, PageQuery } from '@halfpitch/contracts';
import { Who } from '../common/actor';
import type { Actor } from '../common/actor';
import { Permit } from '../common/permit';
import { OdometerService } from './odometer.service';

@Controller('bikes/:id/odometer')
export class OdometerController {
  constructor(private readonly odometer: OdometerService) {}

  @Get()
  @Permit('bikes.read')
  @SerializeOptions({ schema: odometerPage })
  list(
    @Who() actor: Actor,
    @Param('id', { schema: id }) bikeId: string,
    @Query({ schema: pageQuery }) page: PageQuery,
  ): Promise<Page<OdometerReading>> {
    return this.odometer.list(actor, bikeId, page);
  }

  @Post()
  @Permit('bikes.write')
  @SerializeOptions({ schema: odometerReading })
  record(
    @Who() actor: Actor,
    @Param('id', { schema: id }) bikeId: string,
    @Body({ schema: odometerInput }) input: OdometerInput,
  ): Promise<OdometerReading> {
    return this.odometer.record(actor, bikeId, input);
  }

  @Delete(':readingId')
  @Permit('bikes.write')
  @SerializeOptions({ schema: done })
  remove(
    @Who() actor: Actor,
    @Param('id', { schema: id }) bikeId: string,
    @Param('readingId', { schema: id }) readingId: string,
  ): Promise<Done> {
    return this.odometer.remove(actor, bikeId, readingId).then(() => ({ done: true }));
  }
}
