import { Body, Controller, Delete, Get, Headers, Param, Post, Query, SerializeOptions } from '@nestjs/common';
import { done, id, reading, readingInput, readingPage, readingQuery } from '@halfpitch/contracts';
import type { Done, Page, Reading, ReadingInput, ReadingQuery } from '@halfpitch/contracts';
import { Who } from '../common/actor';
import type { Actor } from '../common/actor';
import { Permit } from '../common/permit';
import { ReadingsService } from './readings.service';

@Controller('readings')
export class ReadingsController {
  constructor(private readonly readings: ReadingsService) {}

  @Get()
  @Permit('bikes.read')
  @SerializeOptions({ schema: readingPage })
  list(@Who() actor: Actor, @Query({ schema: readingQuery }) query: ReadingQuery): Promise<Page<Reading>> {
    return this.readings.list(actor, query);
  }

  @Post()
  @Permit('readings.write')
  @SerializeOptions({ schema: reading })
  create(
    @Who() actor: Actor,
    @Body({ schema: readingInput }) input: ReadingInput,
    @Headers('idempotency-key') key?: string,
  ): Promise<Reading> {
    return this.readings.create(actor, input, key);
  }

  @Delete(':id')
  @Permit('readings.write')
  @SerializeOptions({ schema: done })
  remove(@Who() actor: Actor, @Param('id', { schema: id }) readingId: string): Promise<Done> {
    return this.readings.remove(actor, readingId).then(() => ({ done: true }));
  }
}
