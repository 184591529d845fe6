import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { Sequelize } from 'sequelize-typescript';
import { installFirmScope } from './firm-scope';

/** Puts the firm scope on every model as soon as the models are known. */
@Injectable()
export class FirmScopeInstaller {
  constructor(@InjectConnection() sequelize: Sequelize) {
    installFirmScope(sequelize);
  }
}
