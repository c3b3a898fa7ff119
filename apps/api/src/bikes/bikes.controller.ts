import { Body, Controller, Delete, Get, Param, Post, Put, Query, SerializeOptions } from '@nestjs/common';
import { bike, bikeInput, bikePage, bikeQuery, done, id, newBike } from '@halfpitch/contracts';
import type { Bike, BikeInput, BikeQuery, Done, NewBike, Page } from '@halfpitch/contracts';
import { Who } from '../common/actor';
import type { Actor } from '../common/actor';
import { Permit } from '../common/permit';
import { BikesService } from './bikes.service';

@Controller('bikes')
export class BikesController {
  constructor(private readonly bikes: BikesService) {}

  @Get()
  @Permit('bikes.read')
  @SerializeOptions({ schema: bikePage })
  list(@Who() actor: Actor, @Query({ schema: bikeQuery }) query: BikeQuery): Promise<Page<Bike>> {
    return this.bikes.list(actor, query);
  }

  @Post()
  @Permit('bikes.write')
  @SerializeOptions({ schema: bike })
  create(@Who() actor: Actor, @Body({ schema: newBike }) input: NewBike): Promise<Bike> {
    return this.bikes.create(actor, input);
  }

  @Get(':id')
  @Permit('bikes.read')
  @SerializeOptions({ schema: bike })
  read(@Who() actor: Actor, @Param('id', { schema: id }) bikeId: string): Promise<Bike> {
    return this.bikes.read(actor, bikeId);
  }

  @Put(':id')
  @Permit('bikes.write')
  @SerializeOptions({ schema: bike })
  change(
    @Who() actor: Actor,
    @Param('id', { schema: id }) bikeId: string,
    @Body({ schema: bikeInput }) input: BikeInput,
  ): Promise<Bike> {
    return this.bikes.change(actor, bikeId, input);
  }

  @Delete(':id')
  @Permit('bikes.write')
  @SerializeOptions({ schema: done })
  remove(@Who() actor: Actor, @Param('id', { schema: id }) bikeId: string): Promise<Done> {
    return this.bikes.remove(actor, bikeId).then(() => ({ done: true }));
  }
}
