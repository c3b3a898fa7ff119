import { Module } from '@nestjs/common';
import { BikesModule } from '../bikes/bikes.module';
import { RidersModule } from '../riders/riders.module';
import { ChainChanges } from './chain-changes';
import { ChainMovesController } from './chain-moves.controller';
import { ChainsController } from './chains.controller';
import { ChainsService } from './chains.service';
import { FittingHistoryService } from './fitting-history.service';
import { FittingService } from './fitting.service';
import { FittingsController } from './fittings.controller';
import { RideChains } from './ride-chains';

@Module({
  imports: [RidersModule, BikesModule],
  controllers: [ChainsController, ChainMovesController, FittingsController],
  providers: [ChainsService, ChainChanges, FittingService, FittingHistoryService, RideChains],
  exports: [ChainsService, ChainChanges, RideChains],
})
export class ChainsModule {}
