import { Controller, Get, SerializeOptions } from '@nestjs/common';
import { accuracy } from '@halfpitch/contracts';
import type { Accuracy } from '@halfpitch/contracts';
import { Who } from '../common/actor';
import type { Actor } from '../common/actor';
import { Permit } from '../common/permit';
import { AccuracyService } from './accuracy.service';

@Controller('accuracy')
export class AccuracyController {
  constructor(private readonly accuracy: AccuracyService) {}

  @Get()
  @Permit('bench.read')
  @SerializeOptions({ schema: accuracy })
  read(@Who() actor: Actor): Promise<Accuracy> {
    return this.accuracy.read(actor);
  }
}
