import { Module } from '@nestjs/common';
import { AccountsModule } from '../accounts/accounts.module';
import { PlansModule } from '../plans/plans.module';
import { WorkshopModule } from '../workshop/workshop.module';
import { CalendarController } from './calendar.controller';
import { CalendarService } from './calendar.service';

@Module({
  imports: [WorkshopModule, AccountsModule, PlansModule],
  controllers: [CalendarController],
  providers: [CalendarService],
})
export class CalendarModule {}
