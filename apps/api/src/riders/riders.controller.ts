import { Body, Controller, Delete, Get, Param, Post, Put, Query, SerializeOptions } from '@nestjs/common';
import {
  done,
  id,
  reminderSwitch,
  rider,
  riderInput,
  riderPage,
  riderQuery,
  riderSelf,
  riderSelfInput,
} from '@halfpitch/contracts';
import type { Done, Page, Rider, RiderInput, RiderQuery, RiderSelfInput } from '@halfpitch/contracts';
import { Who } from '../common/actor';
import type { Actor } from '../common/actor';
import { Permit } from '../common/permit';
import { RidersService } from './riders.service';

@Controller('riders')
export class RidersController {
  constructor(private readonly riders: RidersService) {}

  @Get()
  @Permit('riders.read')
  @SerializeOptions({ schema: riderPage })
  list(@Query({ schema: riderQuery }) query: RiderQuery): Promise<Page<Rider>> {
    return this.riders.list(query);
  }

  @Post()
  @Permit('riders.write')
  @SerializeOptions({ schema: rider })
  create(@Who() actor: Actor, @Body({ schema: riderInput }) input: RiderInput): Promise<Rider> {
    return this.riders.create(actor, input);
  }

  @Get('me')
  @Permit('bikes.read')
  @SerializeOptions({ schema: riderSelf })
  readSelf(@Who() actor: Actor): Promise<Rider> {
    return this.riders.readSelf(actor);
  }

  @Put('me')
  @Permit('bikes.write')
  @SerializeOptions({ schema: riderSelf })
  changeSelf(@Who() actor: Actor, @Body({ schema: riderSelfInput }) input: RiderSelfInput): Promise<Rider> {
    return this.riders.changeSelf(actor, input);
  }

  @Get(':id')
  @Permit('riders.read')
  @SerializeOptions({ schema: rider })
  read(@Who() actor: Actor, @Param('id', { schema: id }) riderId: string): Promise<Rider> {
    return this.riders.read(actor, riderId);
  }

  @Put(':id')
  @Permit('riders.write')
  @SerializeOptions({ schema: rider })
  change(
    @Who() actor: Actor,
    @Param('id', { schema: id }) riderId: string,
    @Body({ schema: riderInput }) input: RiderInput,
  ): Promise<Rider> {
    return this.riders.change(actor, riderId, input);
  }

  @Put(':id/reminders')
  @Permit('riders.write')
  @SerializeOptions({ schema: rider })
  remind(
    @Who() actor: Actor,
    @Param('id', { schema: id }) riderId: string,
    @Body({ schema: reminderSwitch }) { on }: { on: boolean },
  ): Promise<Rider> {
    return this.riders.change(actor, riderId, { remindersOn: on });
  }

  @Post(':id/invitation')
  @Permit('riders.invite')
  @SerializeOptions({ schema: rider })
  invite(@Who() actor: Actor, @Param('id', { schema: id }) riderId: string): Promise<Rider> {
    return this.riders.invite(actor, riderId);
  }

  @Delete(':id')
  @Permit('riders.write')
  @SerializeOptions({ schema: done })
  remove(@Who() actor: Actor, @Param('id', { schema: id }) riderId: string): Promise<Done> {
    return this.riders.remove(actor, riderId).then(() => ({ done: true }));
  }
}
