/** A rider as the wire has them, with access and counts, from one statement. */
export const RIDER_COLUMNS = `
  rider.id, rider.name, rider.email, rider.phone, rider.notes,
  rider.distance_unit as "distanceUnit", rider.reminders_on as "remindersOn",
  case when member.id is null then 'none' when member.account_id is null then 'invited' else 'joined' end as access,
  (select count(*)::int from bike where bike.rider_id = rider.id) as bikes,
  (select count(*)::int from chain where chain.rider_id = rider.id and chain.retired_on is null) as chains`;

export const RIDER_FROM = 'rider left join member on member.rider_id = rider.id';
