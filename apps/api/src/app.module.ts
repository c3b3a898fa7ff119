import { DynamicModule, Module, StandardSchemaSerializerInterceptor } from '@nestjs/common';
import { ConfigModule } from '@nestjs/config';
import { APP_FILTER, APP_GUARD, APP_INTERCEPTOR, APP_PIPE, Reflector } from '@nestjs/core';
import { ScheduleModule } from '@nestjs/schedule';
import { AccuracyModule } from './accuracy/accuracy.module';
import { AccountsModule } from './accounts/accounts.module';
import { BikesModule } from './bikes/bikes.module';
import { CalendarModule } from './calendar/calendar.module';
import { ChainsModule } from './chains/chains.module';
import { CommonModule } from './common/common.module';
import { PermitGuard } from './common/permit.guard';
import { ProblemFilter } from './common/problem.filter';
import { TransactionInterceptor } from './common/transaction.interceptor';
import { validationPipe } from './common/validation';
import { Environment } from './config/environment';
import { DatabaseModule } from './database/database.module';
import { EstimatesModule } from './estimates/estimates.module';
import { RemindersModule } from './reminders/reminders.module';
import { TestHooksModule } from './test-hooks/test-hooks.module';
import { WorkloadModule } from './workload/workload.module';
import { HealthModule } from './health/health.module';
import { JobsModule } from './jobs/jobs.module';
import { MailModule } from './mail/mail.module';
import { PlansModule } from './plans/plans.module';
import { ReadingsModule } from './readings/readings.module';
import { RidersModule } from './riders/riders.module';
import { RidesModule } from './rides/rides.module';
import { TreatmentsModule } from './treatments/treatments.module';
import { WorkshopModule } from './workshop/workshop.module';

@Module({
  imports: [
    ScheduleModule.forRoot(),
    CommonModule,
    DatabaseModule,
    JobsModule,
    MailModule,
    HealthModule,
    WorkshopModule,
    AccountsModule,
    RidersModule,
    BikesModule,
    ChainsModule,
    RidesModule,
    ReadingsModule,
    TreatmentsModule,
    EstimatesModule,
    PlansModule,
    CalendarModule,
    RemindersModule,
    WorkloadModule,
    AccuracyModule,
  ],
  providers: [
    { provide: APP_FILTER, useClass: ProblemFilter },
    { provide: APP_GUARD, useClass: PermitGuard },
    { provide: APP_PIPE, useValue: validationPipe },
    {
      provide: APP_INTERCEPTOR,
      inject: [Reflector],
      useFactory: (reflector: Reflector) => new StandardSchemaSerializerInterceptor(reflector),
    },
    { provide: APP_INTERCEPTOR, useClass: TransactionInterceptor },
  ],
})
export class AppModule {
  /** The whole program in an environment that was read and checked. */
  static in(environment: Environment): DynamicModule {
    const config = ConfigModule.forRoot({
      isGlobal: true,
      ignoreEnvFile: true,
      skipProcessEnv: true,
      load: [() => environment],
    });
    return { module: AppModule, imports: environment.TEST_HOOKS ? [config, TestHooksModule] : [config] };
  }
}
