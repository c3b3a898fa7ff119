import { Injectable } from '@nestjs/common';
import type { ImportTarget, Page, RideImport as WireImport, RideImportQuery } from '@halfpitch/contracts';
import { Bike } from '../bikes/bike.entity';
import { BikesService } from '../bikes/bikes.service';
import { ChainsService } from '../chains/chains.service';
import type { Actor } from '../common/actor';
import { notFound, unprocessable } from '../common/problems';
import { TenantDb } from '../database/tenant-db';
import { QueueService } from '../jobs/queue.service';
import { pageOf } from '../common/paging';
import { mayReachRider, ridersInReach } from '../riders/riders.policy';
import { RideImport } from './ride-import.entity';

/** What of a received file is used. */
export interface ReceivedFile {
  originalname: string;
  buffer: Buffer;
}

function toImport(rideImport: RideImport): WireImport {
  const { id, fileName, state, total, added, alreadyThere, refused, otherSport, problems, message, bikeId } =
    rideImport;
  const counts = { total, added, alreadyThere, refused, otherSport };
  return {
    id,
    fileName,
    state,
    ...counts,
    problems,
    message,
    bikeId,
    sentAt: rideImport.createdAt.toISOString(),
  };
}

/** Takes files in; a task of the queue reads them. */
@Injectable()
export class ImportsService {
  constructor(
    private readonly db: TenantDb,
    private readonly bikes: BikesService,
    private readonly chains: ChainsService,
    private readonly queue: QueueService,
  ) {}

  async receive(actor: Actor, target: ImportTarget, file: ReceivedFile | undefined): Promise<WireImport> {
    if (!file) throw unprocessable('file', 'Choose a file.');
    const { workshopId } = actor;
    const bike = await this.bikeOf(actor, target);
    const rideImport = Object.assign(new RideImport(), {
      workshopId,
      riderId: bike.riderId,
      bikeId: bike.id,
      fileName: file.originalname.slice(0, 200),
      surface: target.surface,
      weather: target.weather,
      otherSports: target.otherSports,
      matching: target.matching ?? null,
      file: file.buffer,
    });
    await this.db.manager.insert(RideImport, rideImport);
    await this.queue.send('import-rides', { workshopId, importId: rideImport.id });
    return toImport(rideImport);
  }

  async read(actor: Actor, id: string): Promise<WireImport> {
    const rideImport = await this.db.manager.findOneBy(RideImport, { id });
    if (!rideImport || !mayReachRider(actor, rideImport.riderId)) throw notFound('import');
    return toImport(rideImport);
  }

  list(actor: Actor, { riderId, ...page }: RideImportQuery): Promise<Page<WireImport>> {
    const query = this.db.manager.createQueryBuilder(RideImport, 'import').orderBy('import.id', 'DESC');
    const rider = ridersInReach(actor, riderId);
    if (rider) query.andWhere('import.riderId = :rider', { rider });
    return pageOf(query, page, toImport);
  }

  /** The bike that is meant: itself, or the one the chain is on. */
  private async bikeOf(actor: Actor, { bikeId, chainId }: ImportTarget): Promise<Bike> {
    if (bikeId !== undefined) return this.bikes.reach(actor, bikeId);
    const chain = await this.chains.read(actor, chainId!);
    if (chain.bikeId === null)
      throw unprocessable(
        'chainId',
        `The chain “${chain.label}” is on no bike: fit it first, or choose a bike.`,
      );
    return this.bikes.reach(actor, chain.bikeId);
  }
}
