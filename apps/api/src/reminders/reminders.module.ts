import { Module } from '@nestjs/common';
import { ChainsModule } from '../chains/chains.module';
import { EstimatesModule } from '../estimates/estimates.module';
import { TreatmentsModule } from '../treatments/treatments.module';
import { WorkshopModule } from '../workshop/workshop.module';
import { DueReminders } from './due-reminders';
import { RemindersController } from './reminders.controller';
import { RemindersService } from './reminders.service';
import { StopController } from './stop.controller';
import { StopService } from './stop.service';
import { WriteReminderService } from './write-reminder.service';

@Module({
  imports: [ChainsModule, EstimatesModule, TreatmentsModule, WorkshopModule],
  controllers: [RemindersController, StopController],
  providers: [DueReminders, RemindersService, StopService, WriteReminderService],
})
export class RemindersModule {}
