import { Module } from '@nestjs/common';
import { ChainsModule } from '../chains/chains.module';
import { WorkshopModule } from '../workshop/workshop.module';
import { ChainHistories } from './chain-histories';
import { EstimatesController } from './estimates.controller';
import { EstimatesService } from './estimates.service';
import { EstimatesTasks } from './estimates.tasks';
import { ModelController } from './model.controller';
import { NightlyClock } from './nightly.clock';
import { Estimator } from './estimator.service';
import { RefitTasks } from './refit.tasks';
import { UsageService } from './usage.service';

@Module({
  imports: [ChainsModule, WorkshopModule],
  controllers: [EstimatesController, ModelController],
  providers: [
    ChainHistories,
    EstimatesService,
    EstimatesTasks,
    Estimator,
    NightlyClock,
    RefitTasks,
    UsageService,
  ],
  exports: [EstimatesService, Estimator, NightlyClock],
})
export class EstimatesModule {}
