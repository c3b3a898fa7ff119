/** Why a chain can't have been treated on this day, or null where it can. */
export function wrongTreatmentDay(
  day: string,
  chain: { inServiceOn: string; retiredOn: string | null },
  today: string,
): string | null {
  if (day > today) return `${day} is still to come; today is ${today}.`;
  if (day < chain.inServiceOn) return `The chain went into service on ${chain.inServiceOn}, after that day.`;
  if (chain.retiredOn !== null && day > chain.retiredOn)
    return `The chain was retired on ${chain.retiredOn}, before that day.`;
  return null;
}
