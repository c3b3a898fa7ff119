import { Module } from '@nestjs/common';
import { RidersModule } from '../riders/riders.module';
import { BikesController } from './bikes.controller';
import { BikesService } from './bikes.service';
import { OdometerController } from './odometer.controller';
import { OdometerService } from './odometer.service';

@Module({
  imports: [RidersModule],
  controllers: [BikesController, OdometerController],
  providers: [BikesService, OdometerService],
  exports: [BikesService],
})
export class BikesModule {}
