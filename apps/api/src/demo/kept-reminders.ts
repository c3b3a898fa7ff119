import type { Chain } from '../chains/chain.entity';
import type { Estimate } from '../estimates/estimate.entity';
import type { Mail } from '../mail/mail.entity';
import { dueKinds } from '../reminders/due-reminders.service';
import { reminderLetter } from '../reminders/reminder-letter';
import type { Reminder } from '../reminders/reminder.entity';
import { cycleOf } from '../reminders/reminder-writer.service';
import type { Subject } from '../reminders/subjects';
import type { Workshop } from '../workshop/workshop.entity';
import { Random } from './random';
import type { Household } from './records';

const EARLY = 4 * 3_600_000;
const morning = (day: string) => new Date(Date.parse(day) + EARLY);
const dayOfInstant = (at: Date) => Math.floor(at.getTime() / 86_400_000);

/** Whom a letter of that day was for, as the product would have found it. */
function subjectAsOf({ rider, bikes, fittings, treatments }: Household, chain: Chain, day: string): Subject {
  const fitting = fittings.filter(({ chainId, fromDay }) => chainId === chain.id && fromDay <= day).at(-1);
  const fitted = fitting && (fitting.toDay === null || fitting.toDay >= day);
  const treated = treatments.filter((treatment) => treatment.chainId === chain.id && treatment.day <= day);
  return {
    chainId: chain.id,
    label: chain.label,
    regime: chain.regime,
    retired: false,
    bikeName: fitted ? (bikes.find(({ id }) => id === fitting.bikeId)?.name ?? null) : null,
    riderId: rider.id,
    riderName: rider.name,
    email: rider.email,
    stopToken: rider.stopToken,
    remindersOn: rider.remindersOn,
    lastTreatmentId: treated.at(-1)?.id ?? null,
    inServiceOn: chain.inServiceOn,
  };
}

/** The day that answered a letter: the next treatment's, or the chain's last. */
function closedOn(
  { treatments }: Household,
  chain: Chain,
  kind: Reminder['kind'],
  day: string,
): string | null {
  const next = treatments.find((treatment) => treatment.chainId === chain.id && treatment.day > day);
  return (kind === 'lubrication' && next?.day) || chain.retiredOn;
}

/** The letter of a kept reminder; like every letter that was sent it keeps no text. */
function sentLetter(
  random: Random,
  workshop: Workshop,
  subject: Subject,
  kind: Reminder['kind'],
  of: Estimate,
): Mail {
  const { madeOn: today, detail } = of;
  const window = detail[kind] ?? detail.replacement;
  const publicUrl = 'https://halfpitch.example';
  const letter = reminderLetter({ kind, subject, window, detail, workshop, today, publicUrl });
  const at = morning(today);
  return {
    id: random.id(dayOfInstant(at)),
    workshopId: workshop.id,
    accountId: null,
    toAddress: subject.email,
    subject: letter.subject,
    text: '',
    html: '',
    headers: {},
    state: 'sent',
    attempts: 1,
    lastError: null,
    createdAt: at,
    sentAt: at,
  };
}

/** The reminders that the kept estimates called for under the workshop's policy: closed ones and some still open. */
export function keptReminders(
  random: Random,
  household: Household,
  estimates: readonly Estimate[],
  workshop: Workshop,
): { reminders: Reminder[]; mails: Mail[] } {
  const reminders = new Map<string, Reminder>();
  const mails: Mail[] = [];
  const chains = new Map(household.chains.map((chain) => [chain.id, chain]));
  for (const estimate of household.rider.remindersOn ? estimates : []) {
    const chain = chains.get(estimate.chainId);
    if (!chain) continue;
    const { madeOn, detail } = estimate;
    const subject = subjectAsOf(household, chain, madeOn);
    for (const kind of dueKinds(detail, workshop.settings.reminderPolicy)) {
      const cycle = cycleOf(kind, subject);
      if (reminders.has(`${kind} ${cycle}`)) continue;
      const mail = sentLetter(random, workshop, subject, kind, estimate);
      const closed = closedOn(household, chain, kind, madeOn);
      const { p10, p50, p90 } = detail[kind] ?? detail.replacement;
      mails.push(mail);
      reminders.set(`${kind} ${cycle}`, {
        id: random.id(dayOfInstant(mail.createdAt)),
        workshopId: workshop.id,
        chainId: chain.id,
        riderId: household.rider.id,
        kind,
        cycle,
        mailId: mail.id,
        held: false,
        closedAt: closed === null ? null : morning(closed),
        p10,
        p50,
        p90,
        createdAt: mail.createdAt,
      });
    }
  }
  return { reminders: [...reminders.values()], mails };
}
