import { z } from 'zod';

export const roles = ['rider', 'mechanic', 'desk', 'owner'] as const;
export const role = z.enum(roles);
export type Role = (typeof roles)[number];

const riderPermissions = [
  'bikes.read',
  'bikes.write',
  'rides.write',
  'readings.write',
  'estimates.read',
] as const;
const benchPermissions = [...riderPermissions, 'riders.read', 'bench.read', 'treatments.write'] as const;
const deskPermissions = [
  ...riderPermissions,
  'riders.read',
  'riders.write',
  'riders.invite',
  'bench.read',
  'reminders.read',
  'reminders.send',
] as const;
const ownerPermissions = [
  ...benchPermissions,
  ...deskPermissions,
  'workload.read',
  'workshop.write',
  'staff.write',
] as const;

export type Permission = (typeof ownerPermissions)[number];

/** What each role may do at all; a rider moreover reaches only their own things (the server's policies). */
const grants: Record<Role, ReadonlySet<Permission>> = {
  rider: new Set(riderPermissions),
  mechanic: new Set(benchPermissions),
  desk: new Set(deskPermissions),
  owner: new Set(ownerPermissions),
};

export function roleMay(who: Role, permission: Permission): boolean {
  return grants[who].has(permission);
}
