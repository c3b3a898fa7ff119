import { createParamDecorator, ExecutionContext } from '@nestjs/common';
import type { DistanceUnit, Role } from '@halfpitch/contracts';
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

/** Who signed in, in a controller's handler. */
export const Who = createParamDecorator(
  (_: unknown, context: ExecutionContext): Actor => context.switchToHttp().getRequest<Request>().user as Actor,
);
