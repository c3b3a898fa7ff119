import { Injectable } from '@nestjs/common';
import { TransactionHost } from '@nestjs-cls/transactional';
import { Clock } from '../common/clock';
import { NightlyClock } from '../estimates/nightly.clock';
import { QueueService } from '../jobs/queue.service';

@Injectable()
export class TestHooksService {
  constructor(
    private readonly host: TransactionHost,
    private readonly clock: Clock,
    private readonly nightly: NightlyClock,
    private readonly queue: QueueService,
  ) {}

  /** Moves the clock on and works through the night, outside of the request's own transaction. */
  move(days: number): Promise<{ now: string }> {
    this.clock.advance(days);
    return this.host.withoutTransaction(async () => {
      await this.nightly.askForNight();
      return this.idle();
    });
  }

  idle(): Promise<{ now: string }> {
    return this.host.withoutTransaction(async () => {
      await this.queue.idle();
      return { now: this.clock.now().toISOString() };
    });
  }
}
