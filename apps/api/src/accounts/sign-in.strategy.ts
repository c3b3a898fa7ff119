import { ExecutionContext, Injectable } from '@nestjs/common';
import { AuthGuard, PassportStrategy } from '@nestjs/passport';
import { signIn } from '@halfpitch/contracts';
import type { Request } from 'express';
import { Strategy } from 'passport-local';
import type { Actor } from '../common/actor';
import { ProblemException } from '../common/problems';
import { TenantDb } from '../database/tenant-db';
import { ActorsService } from './actors.service';
import { Directory } from './directory';
import { hashPassword, passwordFits } from './secrets';
import { Throttle } from './throttle';

const WRONG = new ProblemException(
  401,
  'Not signed in',
  'That e-mail address and password do not go together.',
);

@Injectable()
export class SignInStrategy extends PassportStrategy(Strategy) {
  /** Checked when there is no such account, so that the answer takes as long. */
  private readonly nobody = hashPassword('nobody has this password');

  constructor(
    private readonly db: TenantDb,
    private readonly directory: Directory,
    private readonly actors: ActorsService,
    private readonly throttle: Throttle,
  ) {
    super({ usernameField: 'email', passReqToCallback: true });
  }

  async validate(request: Request, address: string, password: string): Promise<Actor> {
    const email = address.trim().toLowerCase();
    await this.throttle.count(request.ip ?? '', email);
    const found = await this.db.run({}, () => this.directory.accountForEmail(email));
    const fits = await passwordFits(found?.password_hash ?? (await this.nobody), password);
    if (!found || !fits) throw WRONG;
    await this.throttle.forget(email);
    const actor = await this.actors.load(await this.actors.firstWorkshop(found.id));
    if (!actor) throw WRONG;
    return actor;
  }
}

/** Signs in: passport makes a new session id, whatever id the browser came with. */
@Injectable()
export class SignInGuard extends AuthGuard('local') {
  override async canActivate(context: ExecutionContext): Promise<boolean> {
    const request = context.switchToHttp().getRequest<Request>();
    const parsed = signIn.safeParse(request.body);
    if (!parsed.success)
      throw new ProblemException(
        400,
        'Please check what you entered',
        'Give your e-mail address and password.',
      );
    await super.canActivate(context);
    await super.logIn(request);
    return true;
  }
}
