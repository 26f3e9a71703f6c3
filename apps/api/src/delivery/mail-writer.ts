import { Injectable } from '@nestjs/common';
import type { SendMailOptions } from 'nodemailer';
import { Settings } from '../config/settings';
import type { OutboundMessage } from '../outbox/channel';
import { ManageLinks } from '../subscribers/manage-links';

const MANAGE_URL = '{manageUrl}';

/** Makes an outbox message into a mail: addressed, with its lasting Message-ID and the way to leave in its headers. */
@Injectable()
export class MailWriter {
  private readonly host: string;

  constructor(
    private readonly links: ManageLinks,
    private readonly settings: Settings,
  ) {
    this.host = new URL(settings.publicUrl).hostname;
  }

  /**
   * Source of the headers: RFC 2369 (List-Unsubscribe), RFC 8058 (one click), RFC 3834 (Auto-Submitted), RFC 5322
   * (Message-ID; the same for every attempt, so that a mail that arrives twice can be told to be one).
   */
  write({
    messageId,
    address,
    subject,
    text,
    html,
    personId,
    lang,
    createdAt,
    isToStaff,
  }: OutboundMessage): SendMailOptions {
    const manageUrl = this.links.urlOf(personId);
    const way = isToStaff ? {} : this.wayToLeave(personId);
    return {
      from: this.settings.smtp.from,
      to: address,
      subject: subject ?? '',
      text: text.replaceAll(MANAGE_URL, manageUrl),
      ...(html !== null && { html: html.replaceAll(MANAGE_URL, manageUrl) }),
      messageId: `<${messageId}@${this.host}>`,
      date: new Date(createdAt * 1000),
      ...way,
      headers: {
        ...way.headers,
        'Auto-Submitted': 'auto-generated',
        'Content-Language': lang,
      },
      disableFileAccess: true,
      disableUrlAccess: true,
    };
  }

  private wayToLeave(personId: number): Pick<SendMailOptions, 'list'> & { headers?: Record<string, string> } {
    return {
      list: { unsubscribe: { url: this.links.leaveUrlOf(personId), comment: 'leave' } },
      headers: { 'List-Unsubscribe-Post': 'List-Unsubscribe=One-Click' },
    };
  }
}
