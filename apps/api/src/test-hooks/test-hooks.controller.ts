import { Body, Controller, HttpCode, Post, SerializeOptions } from '@nestjs/common';
import { z } from 'zod';
import { Public } from '../common/permit';
import { TestHooksService } from './test-hooks.service';

const move = z.object({ days: z.number().int().min(0).max(1000) });
const moment = z.object({ now: z.iso.datetime() });
type Moment = z.infer<typeof moment>;

/** Lets a test move the clock and wait for the queue. Mounted only where TEST_HOOKS asks for it, never in production. */
@Controller('test')
export class TestHooksController {
  constructor(private readonly hooks: TestHooksService) {}

  /** So many days later: the nights between, worked through as one. */
  @Post('clock')
  @HttpCode(200)
  @Public()
  @SerializeOptions({ schema: moment })
  clock(@Body({ schema: move }) { days }: z.infer<typeof move>): Promise<Moment> {
    return this.hooks.move(days);
  }

  /** Answers when the queue has nothing left to do. */
  @Post('idle')
  @HttpCode(200)
  @Public()
  @SerializeOptions({ schema: moment })
  idle(): Promise<Moment> {
    return this.hooks.idle();
  }
}
