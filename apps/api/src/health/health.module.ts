import { Module } from '@nestjs/common';
import { TerminusModule } from '@nestjs/terminus';
import { HealthController } from './health.controller';
import { StoreHealth } from './store-health';

/** Whether the service lives and can do its work. */
@Module({
  imports: [TerminusModule.forRoot({ logger: false })],
  controllers: [HealthController],
  providers: [StoreHealth],
})
export class HealthModule {}
