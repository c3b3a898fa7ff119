import { Injectable } from '@nestjs/common';
import { TenantDb } from '../database/tenant-db';
import { hashToken } from './secrets';

export interface FoundToken {
  id: string;
  purpose: 'reset' | 'invitation';
  account_id: string | null;
  workshop_id: string | null;
  member_id: string | null;
}

/** The few look-ups that come before a workshop is known, each a function of the database's with one answer. */
@Injectable()
export class Directory {
  constructor(private readonly db: TenantDb) {}

  async accountForEmail(email: string): Promise<{ id: string; password_hash: string } | undefined> {
    const rows = await this.db.manager.query<{ id: string; password_hash: string }[]>(
      'select * from account_for_email($1)',
      [email],
    );
    return rows[0];
  }

  async token(secret: string): Promise<FoundToken | undefined> {
    const rows = await this.db.manager.query<FoundToken[]>('select * from token_for_hash($1)', [
      hashToken(secret),
    ]);
    return rows[0];
  }

  async apiToken(
    secret: string,
  ): Promise<{ id: string; account_id: string; workshop_id: string } | undefined> {
    const rows = await this.db.manager.query<{ id: string; account_id: string; workshop_id: string }[]>(
      'select * from api_token_for_hash($1)',
      [hashToken(secret)],
    );
    return rows[0];
  }
}
