import { Injectable, type CanActivate, type ExecutionContext } from '@nestjs/common';
import type { Request } from 'express';
import twilio from 'twilio';
import { Problem } from '../common/problem';
import { Settings } from '../config/settings';

/** Lets in only what the provider signed for the address we are reached at (`PUBLIC_URL`). */
@Injectable()
export class ProviderSignatureGuard implements CanActivate {
  constructor(private readonly settings: Settings) {}

  canActivate(context: ExecutionContext): boolean {
    const request = context.switchToHttp().getRequest<Request>();
    const signature = request.header(twilio.SIGNATURE_HEADER) ?? '';
    const url = this.settings.publicUrl + request.originalUrl;
    const form = (request.body ?? {}) as Record<string, string>;
    if (twilio.validateRequest(this.settings.sms.authToken, signature, url, form)) return true;
    throw new Problem(
      'signature-not-valid',
      'The call is not signed by the text-message provider for this address. Check SMS_AUTH_TOKEN and PUBLIC_URL.',
    );
  }
}
