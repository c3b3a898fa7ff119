import { MiddlewareConsumer, Module, NestModule, RequestMethod } from '@nestjs/common';
import { BikesModule } from '../bikes/bikes.module';
import { ChainsModule } from '../chains/chains.module';
import { WorkshopModule } from '../workshop/workshop.module';
import { ImportBatch } from './import-batch';
import { ImportTasks } from './import.tasks';
import { ImportsController } from './imports.controller';
import { ImportsService } from './imports.service';
import { receiveFile } from './receive-file';
import { RemovedRides } from './removed-rides';
import { RidesController } from './rides.controller';
import { RidesService } from './rides.service';
import { RidingDaysService } from './riding-days.service';

@Module({
  imports: [WorkshopModule, BikesModule, ChainsModule],
  controllers: [RidesController, ImportsController],
  providers: [RidesService, RemovedRides, RidingDaysService, ImportsService, ImportBatch, ImportTasks],
})
export class RidesModule implements NestModule {
  configure(consumer: MiddlewareConsumer): void {
    consumer.apply(receiveFile).forRoutes({ path: 'imports', method: RequestMethod.POST });
  }
}
