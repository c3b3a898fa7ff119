import {
  Body,
  Controller,
  Delete,
  Get,
  Headers,
  HttpCode,
  Param,
  Post,
  Put,
  Query,
  SerializeOptions,
} from '@nestjs/common';
import {
  done,
  id,
  ride,
  rideInput,
  ridePage,
  rideQuery,
  ridingDayQuery,
  ridingDays,
} from '@halfpitch/contracts';
import type {
  Done,
  Page,
  Ride,
  RideInput,
  RideQuery,
  RidingDayQuery,
  RidingDays,
} from '@halfpitch/contracts';
import { Who } from '../common/actor';
import type { Actor } from '../common/actor';
import { Permit } from '../common/permit';
import { RidesService } from './rides.service';
import { RidingDaysService } from './riding-days.service';

@Controller('rides')
export class RidesController {
  constructor(
    private readonly rides: RidesService,
    private readonly ridingDays: RidingDaysService,
  ) {}

  @Get()
  @Permit('bikes.read')
  @SerializeOptions({ schema: ridePage })
  list(@Who() actor: Actor, @Query({ schema: rideQuery }) query: RideQuery): Promise<Page<Ride>> {
    return this.rides.list(actor, query);
  }

  @Get('by-day')
  @Permit('bikes.read')
  @SerializeOptions({ schema: ridingDays })
  byDay(@Who() actor: Actor, @Query({ schema: ridingDayQuery }) query: RidingDayQuery): Promise<RidingDays> {
    return this.ridingDays.read(actor, query);
  }

  @Post()
  @Permit('rides.write')
  @SerializeOptions({ schema: ride })
  create(
    @Who() actor: Actor,
    @Body({ schema: rideInput }) input: RideInput,
    @Headers('idempotency-key') key?: string,
  ): Promise<Ride> {
    return this.rides.create(actor, input, key);
  }

  @Get(':id')
  @Permit('bikes.read')
  @SerializeOptions({ schema: ride })
  read(@Who() actor: Actor, @Param('id', { schema: id }) rideId: string): Promise<Ride> {
    return this.rides.read(actor, rideId);
  }

  @Put(':id')
  @Permit('rides.write')
  @SerializeOptions({ schema: ride })
  change(
    @Who() actor: Actor,
    @Param('id', { schema: id }) rideId: string,
    @Body({ schema: rideInput }) input: RideInput,
  ): Promise<Ride> {
    return this.rides.change(actor, rideId, input);
  }

  @Delete(':id')
  @Permit('rides.write')
  @SerializeOptions({ schema: done })
  remove(@Who() actor: Actor, @Param('id', { schema: id }) rideId: string): Promise<Done> {
    return this.rides.remove(actor, rideId).then(() => ({ done: true }));
  }

  @Post(':id/restore')
  @HttpCode(200)
  @Permit('rides.write')
  @SerializeOptions({ schema: ride })
  restore(@Who() actor: Actor, @Param('id', { schema: id }) rideId: string): Promise<Ride> {
    return this.rides.restore(actor, rideId);
  }
}
