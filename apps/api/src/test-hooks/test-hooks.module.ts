import { Module } from '@nestjs/common';
import { EstimatesModule } from '../estimates/estimates.module';
import { TestHooksController } from './test-hooks.controller';
import { TestHooksService } from './test-hooks.service';

@Module({ imports: [EstimatesModule], controllers: [TestHooksController], providers: [TestHooksService] })
export class TestHooksModule {}
