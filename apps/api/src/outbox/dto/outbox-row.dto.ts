import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { pageOf } from '../../common/paging';

/** Where a message can stand. */
export const outboxStates = [
  'queued',
  'sending',
  'accepted',
  'delivered',
  'failed',
  'suppressed',
  'expired',
] as const;
export type OutboxState = (typeof outboxStates)[number];

/** One message to one recipient. */
@ApiSchema({ name: 'Delivery' })
export class OutboxRow {
  @ApiProperty() id!: number;
  @ApiProperty({ enum: ['email', 'sms'] }) channel!: 'email' | 'sms';
  @ApiProperty({ description: 'Masked' }) to!: string;
  @ApiProperty({ enum: outboxStates }) state!: OutboxState;
  @ApiProperty() attempts!: number;
  @ApiProperty({ type: String, format: 'date-time', nullable: true }) lastAt!: string | null;
  @ApiProperty({ type: String, nullable: true }) detail!: string | null;
}

/** One page of messages. */
@ApiSchema({ name: 'DeliveryPage' })
export class OutboxPage extends pageOf(OutboxRow) {}
