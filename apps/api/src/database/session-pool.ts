import { Injectable, OnApplicationShutdown } from '@nestjs/common';
import { ConfigService } from '@nestjs/config';
import { Pool } from 'pg';
import { Environment } from '../config/environment';

/**
 * Connections for sessions and counted tries, apart from those of requests' transactions: what is written here holds
 * at once, and never waits for a transaction that waits for it.
 */
@Injectable()
export class SessionPool implements OnApplicationShutdown {
  readonly pool: Pool;

  constructor(config: ConfigService<Environment, true>) {
    this.pool = new Pool({
      connectionString: config.get('DATABASE_URL'),
      max: 4,
      application_name: 'halfpitch-sessions',
    });
  }

  async onApplicationShutdown(): Promise<void> {
    await this.pool.end();
  }
}
