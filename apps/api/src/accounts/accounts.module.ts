import { MiddlewareConsumer, Module, NestModule } from '@nestjs/common';
import { PassportModule } from '@nestjs/passport';
import { AccountsController } from './accounts.controller';
import { AccountsService } from './accounts.service';
import { ActorsService } from './actors.service';
import { ApiTokensController } from './api-tokens.controller';
import { ApiTokensService } from './api-tokens.service';
import { BearerMiddleware } from './bearer.middleware';
import { Directory } from './directory';
import { InvitationsService } from './invitations.service';
import { PasswordsService } from './passwords.service';
import { RegistrationService } from './registration.service';
import { SessionController } from './session.controller';
import { SessionUserSerializer } from './session-user.serializer';
import { SessionsService } from './sessions.service';
import { SignInStrategy } from './sign-in.strategy';
import { StaffController } from './staff.controller';
import { StaffService } from './staff.service';
import { Throttle } from './throttle';
import { TokensService } from './tokens.service';

@Module({
  imports: [PassportModule.register({ session: true })],
  controllers: [SessionController, AccountsController, ApiTokensController, StaffController],
  providers: [
    AccountsService,
    ActorsService,
    ApiTokensService,
    Directory,
    InvitationsService,
    PasswordsService,
    RegistrationService,
    SessionUserSerializer,
    SessionsService,
    SignInStrategy,
    StaffService,
    Throttle,
    TokensService,
  ],
  exports: [ActorsService, InvitationsService],
})
export class AccountsModule implements NestModule {
  configure(consumer: MiddlewareConsumer): void {
    consumer.apply(BearerMiddleware).forRoutes('{*every}');
  }
}
