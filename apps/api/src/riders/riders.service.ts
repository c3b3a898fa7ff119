import { Injectable } from '@nestjs/common';
import { randomBytes } from 'node:crypto';
import type { Page, Rider as WireRider, RiderInput, RiderQuery, RiderSelfInput } from '@halfpitch/contracts';
import { InvitationsService } from '../accounts/invitations.service';
import { Member } from '../accounts/member.entity';
import type { Actor } from '../common/actor';
import { conflict, notFound } from '../common/problems';
import { Conditions, pageOfSql } from '../common/sql-page';
import { TenantDb } from '../database/tenant-db';
import { RIDER_COLUMNS, RIDER_FROM } from './rider-list';
import { Rider } from './rider.entity';
import { mayReachRider } from './riders.policy';

@Injectable()
export class RidersService {
  constructor(
    private readonly db: TenantDb,
    private readonly invitations: InvitationsService,
  ) {}

  list({ search, ...page }: RiderQuery): Promise<Page<WireRider>> {
    const { where, values } = new Conditions().add(
      `strpos(lower(rider.name || ' ' || rider.email || ' ' || rider.phone), lower(?)) > 0`,
      search,
    );
    const list = { columns: RIDER_COLUMNS, from: RIDER_FROM, where, values, order: 'rider.name, rider.id' };
    return pageOfSql(this.db.manager, list, page);
  }

  async read(actor: Actor, id: string): Promise<WireRider> {
    await this.reach(actor, id);
    const [rider] = await this.db.manager.query<WireRider[]>(
      `select ${RIDER_COLUMNS} from ${RIDER_FROM} where rider.id = $1`,
      [id],
    );
    return rider!;
  }

  /** The rider with this id, where who asks may reach them; else there is none. */
  async reach(actor: Actor, id: string | null): Promise<Rider> {
    const rider =
      id !== null && mayReachRider(actor, id) ? await this.db.manager.findOneBy(Rider, { id }) : null;
    if (!rider) throw notFound('rider');
    return rider;
  }

  async create(actor: Actor, input: RiderInput): Promise<WireRider> {
    await this.refuseTaken(input.email);
    const rider = Object.assign(new Rider(), input, {
      workshopId: actor.workshopId,
      stopToken: randomBytes(32).toString('base64url'),
    });
    await this.db.manager.insert(Rider, rider);
    return this.read(actor, rider.id);
  }

  async change(actor: Actor, id: string, input: Partial<RiderInput & RiderSelfInput>): Promise<WireRider> {
    const rider = await this.reach(actor, id);
    if (input.email !== undefined && input.email !== rider.email) await this.moveTo(rider, input.email);
    await this.db.manager.update(Rider, id, input);
    return this.read(actor, id);
  }

  readSelf(actor: Actor): Promise<WireRider> {
    return this.reach(actor, actor.riderId).then(({ id }) => this.read(actor, id));
  }

  changeSelf(actor: Actor, input: RiderSelfInput): Promise<WireRider> {
    return this.reach(actor, actor.riderId).then(({ id }) => this.change(actor, id, input));
  }

  /** Removes the rider with their bikes, chains and everything logged; the web asks first. */
  async remove(actor: Actor, id: string): Promise<void> {
    await this.reach(actor, id);
    await this.db.manager.delete(Rider, id);
  }

  async invite(actor: Actor, id: string): Promise<WireRider> {
    const { workshopId, name, email } = await this.reach(actor, id);
    await this.invitations.invite({ workshopId, name, email, role: 'rider', riderId: id });
    return this.read(actor, id);
  }

  /** An open invitation follows the rider's address; who has joined signs in as before. */
  private async moveTo(rider: Rider, email: string): Promise<void> {
    await this.refuseTaken(email);
    const member = await this.db.manager.findOneBy(Member, { riderId: rider.id });
    if (member?.accountId === null) await this.db.manager.update(Member, member.id, { email });
  }

  private async refuseTaken(email: string): Promise<void> {
    if (await this.db.manager.existsBy(Rider, { email }))
      throw conflict(`A rider with the address ${email} is already registered here.`);
  }
}
