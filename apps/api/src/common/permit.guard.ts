import { CanActivate, ExecutionContext, Injectable } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { roleMay, scopesInclude } from '@halfpitch/contracts';
import type { Request } from 'express';
import { REQUIREMENT, Requirement } from './permit';
import { forbidden, ProblemException } from './problems';

@Injectable()
export class PermitGuard implements CanActivate {
  constructor(private readonly reflector: Reflector) {}

  canActivate(context: ExecutionContext): boolean {
    const requirement = this.reflector.getAllAndOverride<Requirement | undefined>(REQUIREMENT, [
      context.getHandler(),
      context.getClass(),
    ]);
    if (requirement === 'public') return true;
    const { user: actor, tokenScopes } = context.switchToHttp().getRequest<Request>();
    if (!actor) throw new ProblemException(401, 'Not signed in', 'Sign in first.');
    if (
      tokenScopes &&
      !(requirement && requirement !== 'signed-in' && scopesInclude(tokenScopes, requirement))
    )
      throw forbidden(
        'This token does not include that. Accounts and tokens are reached by signing in only.',
      );
    if (requirement === 'signed-in') return true;
    if (requirement && roleMay(actor.role, requirement)) return true;
    throw forbidden('Your role in this workshop does not include that.');
  }
}
