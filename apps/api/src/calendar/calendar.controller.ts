import { Controller, Delete, Get, Header, Param, Post, SerializeOptions } from '@nestjs/common';
import { calendarFeed, calendarText, done, madeCalendarFeed } from '@halfpitch/contracts';
import type { CalendarFeed, Done, MadeCalendarFeed } from '@halfpitch/contracts';
import { Who } from '../common/actor';
import type { Actor } from '../common/actor';
import { Public, SignedIn } from '../common/permit';
import { CalendarService } from './calendar.service';

@Controller('calendar')
export class CalendarController {
  constructor(private readonly calendar: CalendarService) {}

  @Get()
  @SignedIn()
  @SerializeOptions({ schema: calendarFeed })
  read(@Who() actor: Actor): Promise<CalendarFeed> {
    return this.calendar.read(actor);
  }

  @Post()
  @SignedIn()
  @SerializeOptions({ schema: madeCalendarFeed })
  make(@Who() actor: Actor): Promise<MadeCalendarFeed> {
    return this.calendar.make(actor);
  }

  @Delete()
  @SignedIn()
  @SerializeOptions({ schema: done })
  stop(@Who() actor: Actor): Promise<Done> {
    return this.calendar.stop(actor).then(() => ({ done: true }));
  }

  @Get(':file')
  @Public()
  @Header('Content-Type', 'text/calendar; charset=utf-8')
  @Header('Cache-Control', 'private, no-store')
  @SerializeOptions({ schema: calendarText })
  text(@Param('file') file: string): Promise<string> {
    return this.calendar.text(file);
  }
}
