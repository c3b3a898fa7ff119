import { Module } from '@nestjs/common';
import { ChainsModule } from '../chains/chains.module';
import { ReadingsModule } from '../readings/readings.module';
import { TreatmentsController } from './treatments.controller';
import { TreatmentsService } from './treatments.service';

@Module({
  imports: [ChainsModule, ReadingsModule],
  controllers: [TreatmentsController],
  providers: [TreatmentsService],
  exports: [TreatmentsService],
})
export class TreatmentsModule {}
