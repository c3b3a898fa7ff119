import { Injectable } from '@nestjs/common';
import { TransactionHost } from '@nestjs-cls/transactional';
import { TransactionalAdapterTypeOrm } from '@nestjs-cls/transactional-adapter-typeorm';
import { EntityManager } from 'typeorm';

/** Whose rows a transaction may see: one workshop's, and one account's own. */
export interface Scope {
  workshopId?: string;
  accountId?: string;
}

/**
 * The door in the tenant wall. Every request and every task runs in one transaction that names its workshop first;
 * row-level security in PostgreSQL then shows that workshop's rows and no others, whatever the query says.
 */
@Injectable()
export class TenantDb {
  constructor(private readonly host: TransactionHost<TransactionalAdapterTypeOrm>) {}

  /** The entity manager of the transaction under way. */
  get manager(): EntityManager {
    return this.host.tx;
  }

  /** Runs `work` in a transaction of its own, or in the one under way, within `scope`. */
  run<T>(scope: Scope, work: () => Promise<T>): Promise<T> {
    return this.host.withTransaction(async () => {
      await this.enter(scope);
      return work();
    });
  }

  /** Narrows the transaction under way to `scope`, until it ends. */
  async enter(scope: Scope): Promise<void> {
    await this.manager.query(
      `select set_config('halfpitch.workshop_id', $1, true), set_config('halfpitch.account_id', $2, true)`,
      [scope.workshopId ?? '', scope.accountId ?? ''],
    );
  }
}
