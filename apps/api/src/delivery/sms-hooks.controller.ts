import { Body, Controller, Header, HttpCode, Post, Query, UseGuards } from '@nestjs/common';
import { ApiExcludeController } from '@nestjs/swagger';
import twilio from 'twilio';
import { Public } from '../auth/decorators';
import { IncomingTextsService } from './incoming-texts.service';
import { ProviderSignatureGuard } from './provider-signature.guard';
import { SmsReceiptsService } from './sms-receipts.service';

type Form = Record<string, string | undefined>;

/** What the text-message provider calls. Open to everybody, but only its signature gets in. */
@Public()
@UseGuards(ProviderSignatureGuard)
@ApiExcludeController()
@Controller('hooks/sms')
export class SmsHooksController {
  constructor(
    private readonly receipts: SmsReceiptsService,
    private readonly incoming: IncomingTextsService,
  ) {}

  /** Takes the report of a text's status. */
  @Post('status')
  @HttpCode(204)
  status(@Query('message') messageId = '', @Body() form: Form): Promise<void> {
    const { MessageSid: providerId = '', MessageStatus: status = '', ErrorCode: errorCode } = form;
    return this.receipts.take({ messageId, providerId, status, ...(errorCode && { errorCode }) });
  }

  /** Takes a text that a resident sent, and answers it. */
  @Post('incoming')
  @HttpCode(200)
  @Header('Content-Type', 'text/xml; charset=utf-8')
  async text(@Body() { From: from = '', Body: body = '' }: Form): Promise<string> {
    const answer = new twilio.twiml.MessagingResponse();
    answer.message(await this.incoming.take(from, body));
    return answer.toString();
  }
}
