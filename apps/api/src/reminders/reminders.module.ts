import { Module } from '@nestjs/common';
import { EstimatesModule } from '../estimates/estimates.module';
import { WorkshopModule } from '../workshop/workshop.module';
import { DueReminders } from './due-reminders.service';
import { ReminderWriter } from './reminder-writer.service';
import { RemindersController } from './reminders.controller';
import { RemindersService } from './reminders.service';
import { StopController } from './stop.controller';
import { StopService } from './stop.service';

@Module({
  imports: [EstimatesModule, WorkshopModule],
  controllers: [RemindersController, StopController],
  providers: [DueReminders, ReminderWriter, RemindersService, StopService],
})
export class RemindersModule {}
