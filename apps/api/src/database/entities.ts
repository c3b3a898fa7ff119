import { AccountToken } from '../accounts/account-token.entity';
import { Account } from '../accounts/account.entity';
import { ApiToken } from '../accounts/api-token.entity';
import { Member } from '../accounts/member.entity';
import { Bike } from '../bikes/bike.entity';
import { OdometerReading } from '../bikes/odometer-reading.entity';
import { CalendarFeed } from '../calendar/calendar-feed.entity';
import { Chain } from '../chains/chain.entity';
import { Fitting } from '../chains/fitting.entity';
import { Estimate } from '../estimates/estimate.entity';
import { Mail } from '../mail/mail.entity';
import { PlannedRiding } from '../plans/planned-riding.entity';
import { Reading } from '../readings/reading.entity';
import { Reminder } from '../reminders/reminder.entity';
import { Rider } from '../riders/rider.entity';
import { RideImport } from '../rides/ride-import.entity';
import { Ride } from '../rides/ride.entity';
import { Treatment } from '../treatments/treatment.entity';
import { Workshop } from '../workshop/workshop.entity';

export const entities = [
  Account,
  AccountToken,
  ApiToken,
  Bike,
  CalendarFeed,
  Chain,
  Estimate,
  Fitting,
  Mail,
  Member,
  OdometerReading,
  PlannedRiding,
  Reading,
  Reminder,
  Ride,
  RideImport,
  Rider,
  Treatment,
  Workshop,
];
