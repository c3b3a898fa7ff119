import { Injectable, OnModuleInit } from '@nestjs/common';
import { Clock } from '../common/clock';
import { TenantDb } from '../database/tenant-db';
import { Estimated, Estimator } from '../estimates/estimator.service';
import type { EstimateDetail } from '../estimates/estimate.entity';
import type { StoredSettings } from '../workshop/workshop.entity';
import { chanceWithin } from './due-chance';
import { ReminderWriter } from './reminder-writer.service';
import { closeOutlived, Subject, subjectsOf } from './subjects';

const KINDS = ['lubrication', 'replacement'] as const;

/** What of a chain is due enough to be written about, by the workshop's policy. */
export function dueKinds(
  { lubrication, replacement, weekly }: Pick<EstimateDetail, 'lubrication' | 'replacement' | 'weekly'>,
  policy: StoredSettings['reminderPolicy'],
): (typeof KINDS)[number][] {
  const windows = { lubrication, replacement };
  return KINDS.filter((kind) => {
    const window = windows[kind];
    return policy[kind] && window && chanceWithin(window, weekly[kind] ?? [], policy.days) >= policy.chance;
  });
}

/** Acts on new estimates in their own transaction: what was redone closes its reminders, what is due gets one. */
@Injectable()
export class DueReminders implements OnModuleInit {
  constructor(
    private readonly db: TenantDb,
    private readonly estimator: Estimator,
    private readonly writer: ReminderWriter,
    private readonly clock: Clock,
  ) {}

  onModuleInit(): void {
    this.estimator.onEstimated.add((estimated) => this.act(estimated));
  }

  private async act({ workshop, today, chainIds, estimates }: Estimated): Promise<void> {
    await closeOutlived(this.db.manager, chainIds, this.clock.now());
    const due = estimates.flatMap(({ chainId, detail }) =>
      dueKinds(detail, workshop.settings.reminderPolicy).map((kind) => ({ chainId, kind, detail })),
    );
    if (due.length === 0) return;
    const subjects = await this.subjects(due.map(({ chainId }) => chainId));
    for (const { chainId, kind, detail } of due) {
      const subject = subjects.get(chainId);
      if (!subject?.remindersOn) continue;
      const draft = { kind, subject, detail };
      const id = await this.writer.claim(workshop, draft);
      if (id) await this.writer.write(id, workshop, draft, today);
    }
  }

  private async subjects(chainIds: string[]): Promise<Map<string, Subject>> {
    const subjects = await subjectsOf(this.db.manager, [...new Set(chainIds)]);
    return new Map(subjects.map((subject) => [subject.chainId, subject]));
  }
}
