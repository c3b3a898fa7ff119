import { Injectable, OnModuleInit } from '@nestjs/common';
import type { DueWindow } from '@halfpitch/contracts';
import { Clock } from '../common/clock';
import { TenantDb } from '../database/tenant-db';
import { EstimateChainsService, FreshEstimate } from '../estimates/estimate-chains.service';
import { TreatmentsService } from '../treatments/treatments.service';
import { WriteReminderService } from './write-reminder.service';

type Policy = FreshEstimate['workshop']['settings']['reminderPolicy'];

/** Chance of falling due within the policy's days, read between the three that are kept. */
export function chanceWithin(window: DueWindow, days: number): number {
  const points: [number, number][] = [
    [0, window.chanceNow],
    [7, window.chanceWithin7],
    [14, window.chanceWithin14],
    [30, window.chanceWithin30],
  ];
  const after = points.findIndex(([day]) => day >= days);
  if (after < 0) return window.chanceWithin30;
  const [toDay, to] = points[after]!;
  const [fromDay, from] = points[Math.max(after - 1, 0)]!;
  return toDay === fromDay ? to : from + ((to - from) * (days - fromDay)) / (toDay - fromDay);
}

const isDue = (window: DueWindow | null, { days, chance }: Policy) =>
  window !== null && chanceWithin(window, days) >= chance;

/** Writes to riders whose chains fall due, as estimates are made; closes what a treatment has answered. */
@Injectable()
export class DueReminders implements OnModuleInit {
  constructor(
    private readonly db: TenantDb,
    private readonly estimates: EstimateChainsService,
    private readonly treatments: TreatmentsService,
    private readonly writing: WriteReminderService,
    private readonly clock: Clock,
  ) {}

  onModuleInit(): void {
    this.estimates.onEstimated.add((fresh) => this.remind(fresh));
    this.treatments.onRecorded.add(({ chainId }) => this.close(chainId));
  }

  private async remind(fresh: FreshEstimate[]): Promise<void> {
    for (const estimate of fresh) {
      const policy = estimate.workshop.settings.reminderPolicy;
      const { lubrication, replacement } = estimate.detail;
      if (policy.lubrication && isDue(lubrication, policy)) await this.writing.write(estimate, 'lubrication');
      if (policy.replacement && isDue(replacement, policy)) await this.writing.write(estimate, 'replacement');
    }
  }

  private async close(chainId: string): Promise<void> {
    await this.db.manager.query(
      `update reminder set closed_at = $2 where chain_id = $1 and kind = 'lubrication' and closed_at is null`,
      [chainId, this.clock.now()],
    );
  }
}
