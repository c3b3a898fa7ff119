import { Module } from '@nestjs/common';
import { WorkshopModule } from '../workshop/workshop.module';
import { WorkloadController } from './workload.controller';
import { WorkloadService } from './workload.service';

@Module({ imports: [WorkshopModule], controllers: [WorkloadController], providers: [WorkloadService] })
export class WorkloadModule {}
