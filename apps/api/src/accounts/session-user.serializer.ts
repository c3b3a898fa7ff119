import { Injectable } from '@nestjs/common';
import { PassportSerializer } from '@nestjs/passport';
import type { Actor } from '../common/actor';
import { ActorsService, SessionUser } from './actors.service';

@Injectable()
export class SessionUserSerializer extends PassportSerializer {
  constructor(private readonly actors: ActorsService) {
    super();
  }

  serializeUser({ accountId, workshopId }: Actor, done: (error: null, user: SessionUser) => void): void {
    done(null, { accountId, workshopId });
  }

  deserializeUser(user: SessionUser, done: (error: unknown, actor?: Actor | false) => void): void {
    this.actors.load(user).then((actor) => done(null, actor ?? false), done);
  }
}
