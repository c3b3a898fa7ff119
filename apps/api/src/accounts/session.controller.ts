import { Body, Controller, Delete, Get, Post, Req, SerializeOptions, UseGuards } from '@nestjs/common';
import { chooseWorkshop, Done, done, session, Session, signIn } from '@halfpitch/contracts';
import type { Request } from 'express';
import type { z } from 'zod';
import { Who } from '../common/actor';
import type { Actor } from '../common/actor';
import { Public, SignedIn } from '../common/permit';
import { ActorsService } from './actors.service';
import { SessionsService } from './sessions.service';
import { SignInGuard } from './sign-in.strategy';

@Controller('session')
export class SessionController {
  constructor(
    private readonly actors: ActorsService,
    private readonly sessions: SessionsService,
  ) {}

  @Post()
  @Public()
  @UseGuards(SignInGuard)
  @SerializeOptions({ schema: session })
  signIn(@Who() actor: Actor, @Body({ schema: signIn }) _: z.infer<typeof signIn>): Promise<Session> {
    return this.actors.session(actor);
  }

  @Get()
  @SignedIn()
  @SerializeOptions({ schema: session })
  read(@Who() actor: Actor): Promise<Session> {
    return this.actors.session(actor);
  }

  @Delete()
  @SignedIn()
  @SerializeOptions({ schema: done })
  async signOut(@Req() request: Request): Promise<Done> {
    await this.sessions.end(request);
    return { done: true };
  }

  @Delete('everywhere')
  @SignedIn()
  @SerializeOptions({ schema: done })
  async signOutEverywhere(@Req() request: Request, @Who() actor: Actor): Promise<Done> {
    await this.sessions.end(request);
    await this.sessions.endAll(actor.accountId);
    return { done: true };
  }

  @Post('workshop')
  @SignedIn()
  @SerializeOptions({ schema: session })
  async chooseWorkshop(
    @Req() request: Request,
    @Who() actor: Actor,
    @Body({ schema: chooseWorkshop }) { workshopId }: z.infer<typeof chooseWorkshop>,
  ): Promise<Session> {
    return this.actors.session(await this.sessions.chooseWorkshop(request, actor, workshopId));
  }
}
