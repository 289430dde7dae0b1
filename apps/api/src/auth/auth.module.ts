import { Module } from '@nestjs/common';
import { JwtModule } from '@nestjs/jwt';
import { PassportModule } from '@nestjs/passport';
import { SETTINGS, type Settings } from '../common/settings';
import { AccountController } from './account.controller';
import { AccountService } from './account.service';
import { AuthController } from './auth.controller';
import { AuthService } from './auth.service';
import { JwtStrategy } from './jwt.strategy';
import { LocalStrategy } from './local.strategy';
import { readSecret } from './secret';
import { SessionsService } from './sessions.service';
import { SignInLimiter } from './sign-in-limiter';

/** Signing in, sessions and the own account. */
@Module({
  imports: [
    PassportModule,
    JwtModule.registerAsync({
      inject: [SETTINGS],
      useFactory: (settings: Settings) => ({
        secret: readSecret(settings),
        signOptions: { algorithm: 'HS256' },
      }),
    }),
  ],
  controllers: [AuthController, AccountController],
  providers: [
    AuthService,
    AccountService,
    SessionsService,
    SignInLimiter,
    LocalStrategy,
    JwtStrategy,
  ],
  exports: [SessionsService],
})
export class AuthModule {}
