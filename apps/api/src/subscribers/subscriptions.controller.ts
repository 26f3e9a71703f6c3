import { Body, Controller, Get, HttpCode, Ip, Param, Patch, Post } from '@nestjs/common';
import { ApiAcceptedResponse, ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Public } from '../auth/decorators';
import {
  ConfirmedDto,
  ConfirmRequest,
  SubscriptionReceipt,
  SubscriptionRequest,
  SubscriptionView,
} from './dto/subscription.dto';
import { SubscriptionPatch } from './dto/subscription-patch.dto';
import { RequestLimit } from './request-limit';
import { SubscribersService } from './subscribers.service';

/** A resident's own subscription. Nothing is changed by a GET, for mail scanners open every link. */
@Public()
@ApiTags('public')
@Controller('public/subscriptions')
export class SubscriptionsController {
  constructor(
    private readonly subscribers: SubscribersService,
    private readonly limit: RequestLimit,
  ) {}

  /** Asks to be told next time; the answer is the same whether the address is known or not. */
  @Post()
  @ApiAcceptedResponse({ type: SubscriptionReceipt })
  @HttpCode(202)
  subscribe(@Body() request: SubscriptionRequest, @Ip() client: string): Promise<SubscriptionReceipt> {
    this.limit.count(client);
    return this.subscribers.subscribe(request);
  }

  /** Confirms an address. */
  @Post('confirm')
  @ApiOkResponse({ type: ConfirmedDto })
  @HttpCode(200)
  confirm(@Body() { token }: ConfirmRequest): Promise<ConfirmedDto> {
    return this.subscribers.confirm(token);
  }

  /** Shows a subscriber their own wishes. */
  @Get(':token')
  @ApiOkResponse({ type: SubscriptionView })
  view(@Param('token') token: string): Promise<SubscriptionView> {
    return this.subscribers.view(token);
  }

  /** Changes a subscriber's wishes. */
  @Patch(':token')
  @ApiOkResponse({ type: SubscriptionView })
  change(@Param('token') token: string, @Body() patch: SubscriptionPatch): Promise<SubscriptionView> {
    return this.subscribers.change(token, patch);
  }

  /** Ends a subscription: the button on the page, or a mail program's one-click request (RFC 8058). */
  @Post(':token/leave')
  @ApiNoContentResponse()
  @HttpCode(204)
  leave(@Param('token') token: string): Promise<void> {
    return this.subscribers.leave(token, 'link');
  }
}
