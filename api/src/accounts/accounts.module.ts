import { Module } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import { JwtModule } from '@nestjs/jwt';
import { PassportModule } from '@nestjs/passport';
import { SequelizeModule } from '@nestjs/sequelize';
import { OriginGuard } from '../common/origin.guard';
import { PermissionGuard } from '../common/permission.guard';
import { FirmsModule } from '../firms/firms.module';
import { YardModel } from '../yards/yard.model';
import { MembershipModel } from './membership.model';
import { MembershipYardModel } from './membership-yard.model';
import { MembershipsService } from './memberships.service';
import { PasswordService } from './password.service';
import { PasswordTries } from './password-tries';
import { PeopleController } from './people.controller';
import { PeopleService } from './people.service';
import { PersonModel } from './person.model';
import { SessionController } from './session.controller';
import { SessionGuard } from './session.guard';
import { SessionStrategy } from './session.strategy';
import { SessionTokens } from './session-tokens';
import { SessionsService } from './sessions.service';
import { SignInService } from './sign-in.service';
import { ThrottlingModule } from './throttling.module';

@Module({
  imports: [
    FirmsModule,
    JwtModule.register({}),
    PassportModule,
    SequelizeModule.forFeature([PersonModel, MembershipModel, MembershipYardModel, YardModel]),
    ThrottlingModule,
  ],
  controllers: [SessionController, PeopleController],
  providers: [
    // In this order: where from, who, whether they may.
    { provide: APP_GUARD, useClass: OriginGuard },
    { provide: APP_GUARD, useClass: SessionGuard },
    { provide: APP_GUARD, useClass: PermissionGuard },
    MembershipsService,
    PasswordService,
    PasswordTries,
    PeopleService,
    SessionStrategy,
    SessionTokens,
    SessionsService,
    SignInService,
  ],
  exports: [PasswordService, SessionTokens, SessionsService, SequelizeModule],
})
export class AccountsModule {}
