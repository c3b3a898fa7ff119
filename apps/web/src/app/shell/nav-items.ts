import type { Role } from '@halfpitch/contracts';
import type { LucideIcon } from 'lucide-react';
import {
  Bike,
  CalendarClock,
  CalendarRange,
  CircleHelp,
  FileUp,
  Mail,
  PenLine,
  Settings2,
  UserRound,
  UsersRound,
  Wrench,
} from 'lucide-react';

export interface NavItem {
  to: string;
  label: string;
  icon: LucideIcon;
}

const bench: NavItem = { to: '/bench', label: 'Bench', icon: Wrench };
const riders: NavItem = { to: '/riders', label: 'Riders', icon: UsersRound };
const due: NavItem = { to: '/due', label: 'Due', icon: CalendarClock };
const reminders: NavItem = { to: '/reminders', label: 'Reminders', icon: Mail };

/** Where each role goes; the first is its home, and what it needs most comes first. */
export const navItems: Record<Role, readonly [NavItem, ...NavItem[]]> = {
  rider: [
    { to: '/', label: 'Bikes', icon: Bike },
    { to: '/log', label: 'Log a ride', icon: PenLine },
    { to: '/import', label: 'Ride files', icon: FileUp },
  ],
  mechanic: [bench, riders],
  desk: [due, riders, reminders],
  owner: [
    { to: '/weeks', label: 'The week ahead', icon: CalendarRange },
    due,
    bench,
    riders,
    reminders,
    { to: '/workshop', label: 'Workshop', icon: Settings2 },
  ],
};

export const howItem: NavItem = { to: '/how', label: 'How we estimate', icon: CircleHelp };
export const accountItem: NavItem = { to: '/account', label: 'Account', icon: UserRound };

/** The page a role starts on. */
export const homeOf = (role: Role): string => navItems[role][0].to;
