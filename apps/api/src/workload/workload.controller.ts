import { Controller, Get, SerializeOptions } from '@nestjs/common';
import { workload } from '@halfpitch/contracts';
import type { Workload } from '@halfpitch/contracts';
import { Who } from '../common/actor';
import type { Actor } from '../common/actor';
import { Permit } from '../common/permit';
import { WorkloadService } from './workload.service';

@Controller('workload')
export class WorkloadController {
  constructor(private readonly workload: WorkloadService) {}

  @Get()
  @Permit('workload.read')
  @SerializeOptions({ schema: workload })
  read(@Who() { workshopId }: Actor): Promise<Workload> {
    return this.workload.read(workshopId);
  }
}
