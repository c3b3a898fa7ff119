import { Body, Controller, Get, HttpCode, Param, Post, Query, SerializeOptions } from '@nestjs/common';
import { id, reminder, reminderPage, reminderQuery, sendReminder } from '@halfpitch/contracts';
import type { Page, Reminder, ReminderQuery, SendReminder } from '@halfpitch/contracts';
import { Who } from '../common/actor';
import type { Actor } from '../common/actor';
import { Permit } from '../common/permit';
import { RemindersService } from './reminders.service';

@Controller('reminders')
export class RemindersController {
  constructor(private readonly reminders: RemindersService) {}

  @Get()
  @Permit('reminders.read')
  @SerializeOptions({ schema: reminderPage })
  list(@Query({ schema: reminderQuery }) query: ReminderQuery): Promise<Page<Reminder>> {
    return this.reminders.list(query);
  }

  @Post()
  @Permit('reminders.send')
  @SerializeOptions({ schema: reminder })
  send(@Who() actor: Actor, @Body({ schema: sendReminder }) input: SendReminder): Promise<Reminder> {
    return this.reminders.send(actor, input);
  }

  @Post(':id/hold')
  @HttpCode(200)
  @Permit('reminders.send')
  @SerializeOptions({ schema: reminder })
  hold(@Param('id', { schema: id }) reminderId: string): Promise<Reminder> {
    return this.reminders.hold(reminderId);
  }

  @Post(':id/release')
  @HttpCode(200)
  @Permit('reminders.send')
  @SerializeOptions({ schema: reminder })
  release(@Who() actor: Actor, @Param('id', { schema: id }) reminderId: string): Promise<Reminder> {
    return this.reminders.release(actor, reminderId);
  }
}
