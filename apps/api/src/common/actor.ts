import 'passport';
import { createParamDecorator, ExecutionContext } from '@nestjs/common';
import type { DistanceUnit, Role, TokenScope } from '@halfpitch/contracts';
import type { Request } from 'express';

/** Who is asking: one person in one workshop, in one role. */
export interface Actor {
  accountId: string;
  memberId: string;
  workshopId: string;
  role: Role;
  /** The rider they are, where their role is rider. */
  riderId: string | null;
  name: string;
  email: string;
  distanceUnit: DistanceUnit;
  timeZone: string;
}

declare module 'express-serve-static-core' {
  interface Request {
    user?: Actor | undefined;
    /** What the call's token may do, where it came with one instead of a session. */
    tokenScopes?: readonly TokenScope[];
  }
}

/** Who signed in, in a controller's handler; a handler that is not public always has one. */
export const Who = createParamDecorator(
  (_: unknown, context: ExecutionContext): Actor | undefined =>
    context.switchToHttp().getRequest<Request>().user,
);
