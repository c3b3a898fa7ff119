import { Body, Controller, Delete, Get, Param, Post, Put, Query, SerializeOptions } from '@nestjs/common';
import { done, id, plan, planInput, planPage, planQuery } from '@halfpitch/contracts';
import type { Done, Page, Plan, PlanInput, PlanQuery } from '@halfpitch/contracts';
import { Who } from '../common/actor';
import type { Actor } from '../common/actor';
import { Permit } from '../common/permit';
import { PlansService } from './plans.service';

@Controller('plans')
export class PlansController {
  constructor(private readonly plans: PlansService) {}

  @Get()
  @Permit('bikes.read')
  @SerializeOptions({ schema: planPage })
  list(@Who() actor: Actor, @Query({ schema: planQuery }) query: PlanQuery): Promise<Page<Plan>> {
    return this.plans.list(actor, query);
  }

  @Post()
  @Permit('bikes.write')
  @SerializeOptions({ schema: plan })
  create(@Who() actor: Actor, @Body({ schema: planInput }) input: PlanInput): Promise<Plan> {
    return this.plans.create(actor, input);
  }

  @Get(':id')
  @Permit('bikes.read')
  @SerializeOptions({ schema: plan })
  read(@Who() actor: Actor, @Param('id', { schema: id }) planId: string): Promise<Plan> {
    return this.plans.read(actor, planId);
  }

  @Put(':id')
  @Permit('bikes.write')
  @SerializeOptions({ schema: plan })
  change(
    @Who() actor: Actor,
    @Param('id', { schema: id }) planId: string,
    @Body({ schema: planInput }) input: PlanInput,
  ): Promise<Plan> {
    return this.plans.change(actor, planId, input);
  }

  @Delete(':id')
  @Permit('bikes.write')
  @SerializeOptions({ schema: done })
  remove(@Who() actor: Actor, @Param('id', { schema: id }) planId: string): Promise<Done> {
    return this.plans.remove(actor, planId).then(() => ({ done: true }));
  }
}
