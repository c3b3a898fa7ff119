import { Module } from '@nestjs/common';
import { EstimatesModule } from '../estimates/estimates.module';
import { TestHooksController } from './test-hooks.controller';

@Module({ imports: [EstimatesModule], controllers: [TestHooksController] })
export class TestHooksModule {}
