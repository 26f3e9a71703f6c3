import { Global, Module } from '@nestjs/common';
import path from 'node:path';
import { ConfigModule as EnvironmentFileModule, ConfigService } from '@nestjs/config';
import { readSettings } from './read-settings';
import { Settings } from './settings';

/** apps/api/.env, wherever the service is started from. */
const beside = path.resolve(__dirname, '../../.env');

/** Reads the environment and an optional `.env` file once and offers them as Settings everywhere. */
@Global()
@Module({
  imports: [EnvironmentFileModule.forRoot({ cache: true, envFilePath: ['.env', beside] })],
  providers: [
    {
      provide: Settings,
      inject: [ConfigService],
      useFactory: (config: ConfigService) => readSettings((name) => config.get<string>(name)),
    },
  ],
  exports: [Settings],
})
export class ConfigModule {}
