import {
  Body,
  Controller,
  Get,
  HttpCode,
  Param,
  Post,
  Query,
  SerializeOptions,
  UploadedFile,
} from '@nestjs/common';
import { id, importTarget, rideImport, rideImportPage, rideImportQuery } from '@halfpitch/contracts';
import type { ImportTarget, Page, RideImport, RideImportQuery } from '@halfpitch/contracts';
import { Who } from '../common/actor';
import type { Actor } from '../common/actor';
import { Permit } from '../common/permit';
import { ImportsService } from './imports.service';
import type { ReceivedFile } from './imports.service';

@Controller('imports')
export class ImportsController {
  constructor(private readonly imports: ImportsService) {}

  @Post()
  @HttpCode(202)
  @Permit('rides.write')
  @SerializeOptions({ schema: rideImport })
  receive(
    @Who() actor: Actor,
    @Body({ schema: importTarget }) target: ImportTarget,
    @UploadedFile() file?: ReceivedFile,
  ): Promise<RideImport> {
    return this.imports.receive(actor, target, file);
  }

  @Get()
  @Permit('rides.write')
  @SerializeOptions({ schema: rideImportPage })
  list(
    @Who() actor: Actor,
    @Query({ schema: rideImportQuery }) query: RideImportQuery,
  ): Promise<Page<RideImport>> {
    return this.imports.list(actor, query);
  }

  @Get(':id')
  @Permit('rides.write')
  @SerializeOptions({ schema: rideImport })
  read(@Who() actor: Actor, @Param('id', { schema: id }) importId: string): Promise<RideImport> {
    return this.imports.read(actor, importId);
  }
}
