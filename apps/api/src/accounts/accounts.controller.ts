import { Body, Controller, Get, Param, Post, Put, Req, SerializeOptions } from '@nestjs/common';
import {
  acceptInvitation,
  accountChange,
  changePassword,
  Done,
  done,
  forgottenPassword,
  InvitationView,
  invitationView,
  registerWorkshop,
  resetPassword,
} from '@halfpitch/contracts';
import type { Request } from 'express';
import type { z } from 'zod';
import { Who } from '../common/actor';
import type { Actor } from '../common/actor';
import { Public, SignedIn } from '../common/permit';
import { AccountsService } from './accounts.service';

@Controller()
export class AccountsController {
  constructor(private readonly accounts: AccountsService) {}

  @Post('workshops')
  @Public()
  @SerializeOptions({ schema: done })
  register(
    @Req() request: Request,
    @Body({ schema: registerWorkshop }) input: z.infer<typeof registerWorkshop>,
  ): Promise<Done> {
    return this.accounts.register(request, input);
  }

  @Get('invitations/:token')
  @Public()
  @SerializeOptions({ schema: invitationView })
  invitation(@Param('token') token: string): Promise<InvitationView> {
    return this.accounts.invitation(token);
  }

  @Post('invitations/:token')
  @Public()
  @SerializeOptions({ schema: done })
  accept(
    @Req() request: Request,
    @Param('token') token: string,
    @Body({ schema: acceptInvitation }) input: z.infer<typeof acceptInvitation>,
  ): Promise<Done> {
    return this.accounts.accept(request, token, input);
  }

  @Post('password/forgotten')
  @Public()
  @SerializeOptions({ schema: done })
  forgotten(
    @Req() request: Request,
    @Body({ schema: forgottenPassword }) { email }: z.infer<typeof forgottenPassword>,
  ): Promise<Done> {
    return this.accounts.forgotten(request, email);
  }

  @Post('password/reset')
  @Public()
  @SerializeOptions({ schema: done })
  reset(
    @Req() request: Request,
    @Body({ schema: resetPassword }) input: z.infer<typeof resetPassword>,
  ): Promise<Done> {
    return this.accounts.reset(request, input);
  }

  @Put('password')
  @SignedIn()
  @SerializeOptions({ schema: done })
  changePassword(
    @Req() request: Request,
    @Who() actor: Actor,
    @Body({ schema: changePassword }) input: z.infer<typeof changePassword>,
  ): Promise<Done> {
    return this.accounts.changePassword(request, actor, input);
  }

  @Put('account')
  @SignedIn()
  @SerializeOptions({ schema: done })
  change(
    @Who() actor: Actor,
    @Body({ schema: accountChange }) input: z.infer<typeof accountChange>,
  ): Promise<Done> {
    return this.accounts.change(actor, input);
  }
}
