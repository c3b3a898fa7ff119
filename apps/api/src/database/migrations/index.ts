import { Accounts1764500000001 } from './1764500000001-accounts';
import { BikesAndChains1764500000002 } from './1764500000002-bikes-and-chains';
import { Log1764500000003 } from './1764500000003-log';
import { EstimatesAndReminders1764500000004 } from './1764500000004-estimates-and-reminders';
import { ImportChoices1764500000005 } from './1764500000005-import-choices';
import { PlannedRiding1764500000008 } from './1764500000008-planned-riding';
import { RemovedRides1764500000009 } from './1764500000009-removed-rides';
import { ApiTokens1764500000011 } from './1764500000011-api-tokens';
import { CalendarFeeds1764500000015 } from './1764500000015-calendar-feeds';

export const migrations = [
  Accounts1764500000001,
  BikesAndChains1764500000002,
  Log1764500000003,
  EstimatesAndReminders1764500000004,
  ImportChoices1764500000005,
  PlannedRiding1764500000008,
  RemovedRides1764500000009,
  ApiTokens1764500000011,
  CalendarFeeds1764500000015,
];
