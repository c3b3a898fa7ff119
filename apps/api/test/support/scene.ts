import type { Bike, Chain, NewBike, NewChain, Ride, RideInput, Rider } from '@halfpitch/contracts';
import type request from 'supertest';
import { BootedApp, PASSWORD } from './app';

export type Browser = ReturnType<typeof request.agent>;

/** The calendar day so many days before today, in the time zone of the specs' workshops. */
export function daysAgo(days: number): string {
  const instant = new Date(Date.now() - days * 86_400_000);
  return new Intl.DateTimeFormat('en-CA', { timeZone: 'Europe/Berlin', dateStyle: 'short' }).format(instant);
}

export async function newRider(
  staff: Browser,
  name: string,
  email = `${name.toLowerCase().replaceAll(' ', '.')}@rider.example`,
): Promise<Rider> {
  return (await staff.post('/api/riders').send({ name, email }).expect(201)).body;
}

/** A browser signed in as this rider, by the link in the invitation. */
export async function joined(booted: BootedApp, staff: Browser, rider: Rider): Promise<Browser> {
  await staff.post(`/api/riders/${rider.id}/invitation`).expect(201);
  const letter = await booted.mail.letterTo(rider.email);
  const token = /\/invitation\/([\w-]+)/.exec(letter.text)?.[1];
  const browser = booted.browser();
  await browser.post(`/api/invitations/${token}`).send({ name: rider.name, password: PASSWORD }).expect(201);
  return browser;
}

export async function newBike(
  browser: Browser,
  riderId: string,
  change: Partial<NewBike> = {},
): Promise<Bike> {
  const bike = { riderId, name: 'Commuter', kind: 'commuter', speeds: 10, brakeFluid: 'mineral', ...change };
  return (await browser.post('/api/bikes').send(bike).expect(201)).body;
}

export async function newChain(browser: Browser, bike: Bike, change: Partial<NewChain> = {}): Promise<Chain> {
  const chain = {
    riderId: bike.riderId,
    bikeId: bike.id,
    label: 'A',
    speeds: bike.speeds,
    regime: 'immersion-wax',
    wearLimitPct: null,
    inServiceOn: daysAgo(100),
    ...change,
  };
  return (await browser.post('/api/chains').send(chain).expect(201)).body;
}

export async function newRide(
  browser: Browser,
  bikeId: string,
  change: Partial<RideInput> = {},
): Promise<Ride> {
  const ride = { bikeId, day: daysAgo(1), distanceM: 20_000, surface: 'road', weather: 'dry', ...change };
  return (await browser.post('/api/rides').send(ride).expect(201)).body;
}
