import { Module } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import { JwtModule } from '@nestjs/jwt';
import { PassportModule } from '@nestjs/passport';
import { SequelizeModule } from '@nestjs/sequelize';
import { CONFIG } from '../config/config.module.ts';
import type { Config } from '../config/config.schema.ts';
import { SessionModel } from './models/session.model.ts';
import { SessionGuard } from './session.guard.ts';
import { SessionCookies } from './session-cookies.ts';
import { SessionsController } from './sessions.controller.ts';
import { SignInService } from './sign-in.service.ts';
import { SessionStrategy, TOKEN_AUDIENCE } from './session.strategy.ts';
import { SessionsRepository } from './sessions.repository.ts';
import { SessionsService } from './sessions.service.ts';

@Module({
  imports: [
    PassportModule,
    JwtModule.registerAsync({
      inject: [CONFIG],
      useFactory: (config: Config) => ({
        secret: config.SESSION_SECRET,
        signOptions: { algorithm: 'HS256', audience: TOKEN_AUDIENCE },
      }),
    }),
    SequelizeModule.forFeature([SessionModel]),
  ],
  controllers: [SessionsController],
  providers: [
    SessionCookies,
    SignInService,
    SessionsService,
    SessionsRepository,
    SessionStrategy,
    { provide: APP_GUARD, useClass: SessionGuard },
  ],
  exports: [SessionsService],
})
export class SessionsModule {}
