import { Body, Controller, HttpCode, Post } from '@nestjs/common';
import { z } from 'zod';
import { Clock } from '../common/clock';
import { Public } from '../common/permit';
import { NightlyClock } from '../estimates/nightly.clock';
import { QueueService } from '../jobs/queue.service';

const move = z.object({ days: z.number().int().min(0).max(1000) });

/** Lets a test move the clock and wait for the queue. Mounted only where TEST_HOOKS asks for it, never in production. */
@Controller('test')
export class TestHooksController {
  constructor(
    private readonly clock: Clock,
    private readonly nightly: NightlyClock,
    private readonly queue: QueueService,
  ) {}

  /** So many days later, the nights between worked through as one. */
  @Post('clock')
  @HttpCode(200)
  @Public()
  async moveClock(@Body({ schema: move }) { days }: z.infer<typeof move>): Promise<{ now: string }> {
    this.clock.advance(days);
    await this.nightly.askForNight();
    return { now: this.clock.now().toISOString() };
  }

  /** Answers when the queue has nothing left to do. */
  @Post('idle')
  @HttpCode(200)
  @Public()
  async idle(): Promise<{ idle: true }> {
    await this.queue.idle();
    return { idle: true };
  }
}
