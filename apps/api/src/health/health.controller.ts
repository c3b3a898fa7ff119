import { Controller, Get, ServiceUnavailableException } from '@nestjs/common';
import { HealthCheck, HealthCheckService, TypeOrmHealthIndicator } from '@nestjs/terminus';
import { DataSource } from 'typeorm';
import { Public } from '../common/permit';

/** health: the process answers. ready: it can do its work, with a database that has every migration. */
@Controller()
export class HealthController {
  constructor(
    private readonly checks: HealthCheckService,
    private readonly typeOrm: TypeOrmHealthIndicator,
    private readonly dataSource: DataSource,
  ) {}

  @Get('health')
  @Public()
  health() {
    return { status: 'ok' };
  }

  @Get('ready')
  @Public()
  @HealthCheck()
  async ready() {
    const health = await this.checks.check([() => this.typeOrm.pingCheck('database', { timeout: 2000 })]);
    const [row] = await this.dataSource.query<{ missing: boolean }[]>(
      `select to_regclass('pgboss.job') is null or to_regclass('reminder') is null as missing`,
    );
    if (row?.missing) throw new ServiceUnavailableException('The database is not migrated yet.');
    return health;
  }
}
