import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { FirmModel } from './firm.model';

@Module({ imports: [SequelizeModule.forFeature([FirmModel])], exports: [SequelizeModule] })
export class FirmsModule {}
