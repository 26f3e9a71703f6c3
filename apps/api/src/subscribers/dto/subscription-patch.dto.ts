import { PartialType } from '@nestjs/swagger';
import { SubscriptionWishes } from './subscription.dto';

/** Wishes to change; what is left out stays. */
export class SubscriptionPatch extends PartialType(SubscriptionWishes) {}
