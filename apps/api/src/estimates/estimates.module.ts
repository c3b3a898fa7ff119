import { Module } from '@nestjs/common';
import { ChainsModule } from '../chains/chains.module';
import { WorkshopModule } from '../workshop/workshop.module';
import { EstimateChainsService } from './estimate-chains.service';
import { EstimatesController } from './estimates.controller';
import { EstimatesService } from './estimates.service';
import { EstimatesTasks } from './estimates.tasks';
import { HistoryLoader } from './history-loader';
import { NightlyClock } from './nightly.clock';
import { UsageService } from './usage.service';

@Module({
  imports: [ChainsModule, WorkshopModule],
  controllers: [EstimatesController],
  providers: [
    EstimateChainsService,
    EstimatesService,
    EstimatesTasks,
    HistoryLoader,
    NightlyClock,
    UsageService,
  ],
  exports: [EstimateChainsService, EstimatesService, NightlyClock],
})
export class EstimatesModule {}
