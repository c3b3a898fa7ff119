/** A bike as the wire has it, with its rider's name and the chain on it, from one statement. */
export const BIKE_COLUMNS = `
  bike.id, bike.name, bike.kind, bike.speeds, bike.brake_fluid as "brakeFluid", bike.notes,
  bike.rider_id as "riderId", rider.name as "riderName", fitting.chain_id as "fittedChainId"`;

export const BIKE_FROM = `bike
  join rider on rider.id = bike.rider_id
  left join fitting on fitting.bike_id = bike.id and fitting.to_day is null`;
