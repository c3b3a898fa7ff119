import { Body, Controller, Delete, Get, Param, Post, Query, SerializeOptions } from '@nestjs/common';
import { done, id, inviteStaff, pageQuery, staffMember, staffPage } from '@halfpitch/contracts';
import type { Done, Page, PageQuery, StaffMember } from '@halfpitch/contracts';
import type { z } from 'zod';
import { Who } from '../common/actor';
import type { Actor } from '../common/actor';
import { Permit } from '../common/permit';
import { InvitationsService } from './invitations.service';
import { StaffService, toStaffMember } from './staff.service';

@Controller('staff')
export class StaffController {
  constructor(
    private readonly staff: StaffService,
    private readonly invitations: InvitationsService,
  ) {}

  @Get()
  @Permit('staff.write')
  @SerializeOptions({ schema: staffPage })
  list(@Query({ schema: pageQuery }) query: PageQuery): Promise<Page<StaffMember>> {
    return this.staff.list(query);
  }

  @Post()
  @Permit('staff.write')
  @SerializeOptions({ schema: staffMember })
  async invite(
    @Who() { workshopId }: Actor,
    @Body({ schema: inviteStaff }) input: z.infer<typeof inviteStaff>,
  ): Promise<StaffMember> {
    return toStaffMember(await this.invitations.invite({ workshopId, ...input }));
  }

  @Delete(':id')
  @Permit('staff.write')
  @SerializeOptions({ schema: done })
  async remove(@Who() actor: Actor, @Param('id', { schema: id }) memberId: string): Promise<Done> {
    await this.staff.remove(actor, memberId);
    return { done: true };
  }
}
