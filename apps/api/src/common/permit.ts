import { SetMetadata } from '@nestjs/common';
import type { Permission } from '@halfpitch/contracts';

export type Requirement = Permission | 'public' | 'signed-in';
export const REQUIREMENT = 'halfpitch:requirement';

/** What a handler asks of who calls it. A handler without one answers nobody. */
export const Permit = (requirement: Permission) => SetMetadata(REQUIREMENT, requirement);
export const Public = () => SetMetadata(REQUIREMENT, 'public' satisfies Requirement);
export const SignedIn = () => SetMetadata(REQUIREMENT, 'signed-in' satisfies Requirement);
