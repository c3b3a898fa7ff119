import type { Role } from '@halfpitch/contracts';
import type { Account } from '../accounts/account.entity';
import type { Member } from '../accounts/member.entity';
import type { Rider } from '../riders/rider.entity';
import { addressOf, Place, PLACES, riderName } from './places';
import { Random, seedFor } from './random';
import type { WorkshopScenario } from './scenario';

/** The same for everyone in the demo, which holds nothing real. */
export const DEMO_PASSWORD = 'half-an-inch';

export interface SignIn {
  role: Role;
  workshop: string;
  name: string;
  email: string;
  password: string;
}

/** Riders of the main workshop who can sign in: a commuter, a racer and a gravel rider. */
const RIDERS_WITH_ACCOUNT = 3;

/** Everyone who can sign in to the demo. */
export function demoSignIns(): SignIn[] {
  const [main, second] = PLACES;
  const signIn = (role: Role, name: string, place: Place): SignIn => ({
    role,
    workshop: place.name,
    name,
    email: addressOf(name, place),
    password: DEMO_PASSWORD,
  });
  return [
    signIn('owner', main.owner, main),
    signIn('desk', main.desk, main),
    signIn('mechanic', main.mechanics[0], main),
    ...Array.from({ length: RIDERS_WITH_ACCOUNT }, (_, i) => signIn('rider', riderName(i), main)),
    signIn('owner', second.owner, second),
  ];
}

/** Accounts and memberships of a workshop's people; riders among them are known by their address. */
export function demoPeople(
  { seed, workshop, place }: WorkshopScenario,
  riders: readonly Rider[],
  passwordHash: string,
  day: number,
): { accounts: Account[]; members: Member[] } {
  const random = new Random(seedFor(seed, day));
  const accounts: Account[] = [];
  const members: Member[] = [];
  for (const { role, workshop: at, name, email } of demoSignIns()) {
    if (at !== place.name) continue;
    const rider = riders.find((one) => role === 'rider' && one.email === email);
    if (role === 'rider' && !rider) continue;
    const accountId = random.id(day);
    const { distanceUnit } = rider ?? { distanceUnit: 'km' };
    accounts.push({ id: accountId, name, email, passwordHash, distanceUnit });
    const riderId = rider?.id ?? null;
    members.push({ id: random.id(day), workshopId: workshop.id, accountId, role, riderId, name, email });
  }
  return { accounts, members };
}
