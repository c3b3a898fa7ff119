import { z } from 'zod';
import { email, id, pageOf, shortText } from './common';
import { role } from './permissions';

export const password = z
  .string()
  .min(10, 'A password has at least 10 characters.')
  .max(200, 'A password has at most 200 characters.');
const token = z.string().min(20).max(200);
export const distanceUnit = z.enum(['km', 'mi']);
export type DistanceUnit = z.infer<typeof distanceUnit>;

/** POST /api/session */
export const signIn = z.object({ email, password: z.string().min(1, 'Give your password.').max(200) });
/** GET /api/session, and what signing in answers. */
export const session = z.object({
  account: z.object({ id, name: z.string(), email: z.string() }),
  workshop: z.object({
    id,
    name: z.string(),
    town: z.string(),
    timeZone: z.string(),
    currency: z.string(),
    today: z.iso.date(),
  }),
  role,
  riderId: id.nullable(),
  preferences: z.object({ distanceUnit }),
  workshops: z.array(z.object({ id, name: z.string(), role })),
});
export type Session = z.infer<typeof session>;

/** POST /api/workshops: a new workshop registers itself, who registers becomes its owner. */
export const registerWorkshop = z.object({
  workshopName: shortText('the workshop’s name'),
  town: shortText('the town'),
  timeZone: z.string().refine((zone) => Intl.supportedValuesOf('timeZone').includes(zone) || zone === 'UTC', {
    message: 'Choose a time zone from the list.',
  }),
  name: shortText('your name'),
  email,
  password,
});

/** POST /api/password/forgotten: answers the same whether the address is known or not. */
export const forgottenPassword = z.object({ email });
/** POST /api/password/reset */
export const resetPassword = z.object({ token, password });
/** PUT /api/password */
export const changePassword = z.object({
  current: z.string().min(1, 'Give your present password.'),
  password,
});
/** PUT /api/account */
export const accountChange = z.object({ name: shortText('your name'), distanceUnit });

/** GET /api/invitations/:token, what the invited person sees before accepting. */
export const invitationView = z.object({
  workshopName: z.string(),
  name: z.string(),
  email: z.string(),
  role,
  /** True when this address already has an account: the person then signs in with its password. */
  hasAccount: z.boolean(),
});
export type InvitationView = z.infer<typeof invitationView>;
/** POST /api/invitations/:token: with hasAccount it is the present password, else the new one. */
export const acceptInvitation = z.object({ name: shortText('your name'), password });
/** POST /api/session/workshop: work in another workshop one belongs to. */
export const chooseWorkshop = z.object({ workshopId: id });

/** GET /api/staff, POST /api/staff (invites), DELETE /api/staff/:id */
export const staffMember = z.object({ id, name: z.string(), email: z.string(), role, joined: z.boolean() });
export type StaffMember = z.infer<typeof staffMember>;
export const staffPage = pageOf(staffMember);
export const inviteStaff = z.object({
  name: shortText('a name'),
  email,
  role: z.enum(['mechanic', 'desk', 'owner']),
});
