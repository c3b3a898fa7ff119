import { CallHandler, ExecutionContext, Injectable, NestInterceptor } from '@nestjs/common';
import type { Request } from 'express';
import { from, lastValueFrom, Observable } from 'rxjs';
import { TenantDb } from '../database/tenant-db';

/** One request, one transaction, one workshop: the answer leaves after the commit. */
@Injectable()
export class TransactionInterceptor implements NestInterceptor {
  constructor(private readonly db: TenantDb) {}

  intercept(context: ExecutionContext, next: CallHandler): Observable<unknown> {
    const actor = context.switchToHttp().getRequest<Request>().user;
    const scope = { workshopId: actor?.workshopId, accountId: actor?.accountId };
    return from(this.db.run(scope, () => lastValueFrom(next.handle(), { defaultValue: undefined })));
  }
}
