import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import { Settings } from '../config/settings';
import { OfficeService } from '../office/office.service';
import { OutboxService } from '../outbox/outbox.service';
import type { Channel } from './addresses';
import { ContactsService, type Contact } from './contacts.service';
import type { Language } from './dto/subscription.dto';
import { ManageLinks } from './manage-links';
import { confirmMessage, manageMessage, type Message } from './words/messages';

const DAY_S = 24 * 3600;
/** So many messages about a subscription go to one address in a day; more would help nobody but a prankster. */
const MOST_A_DAY = 3;

/** Writes to one resident about their own subscription. */
@Injectable()
export class SubscriptionMessages {
  constructor(
    private readonly outbox: OutboxService,
    private readonly contacts: ContactsService,
    private readonly office: OfficeService,
    private readonly links: ManageLinks,
    private readonly settings: Settings,
    private readonly clock: Clock,
  ) {}

  /** Sends the link that confirms an address, unless it had its share today. */
  async sendConfirm(contactId: number, channel: Channel, lang: Language): Promise<void> {
    await this.send(contactId, channel, lang, async (office) => {
      const token = await this.contacts.newConfirmToken(contactId);
      return confirmMessage(lang, channel, office, `${this.settings.publicUrl}/s/confirm/${token}`);
    });
  }

  /** Sends somebody who is subscribed already the link to their own page. */
  async sendManage({ id, channel, personId }: Contact, lang: Language): Promise<void> {
    await this.send(id, channel, lang, (office) =>
      Promise.resolve(manageMessage(lang, channel, office, this.links.urlOf(personId))),
    );
  }

  private async send(
    contactId: number,
    channel: Channel,
    lang: Language,
    write: (office: string) => Promise<Message>,
  ): Promise<void> {
    const topic = `subscription:${contactId}`;
    const now = this.clock.now();
    const sent = await this.outbox.countSince(topic, now - DAY_S);
    if (sent >= MOST_A_DAY) return;
    const { name } = await this.office.get();
    await this.outbox.enqueueOne({
      topic,
      contactId,
      channel,
      lang,
      message: await write(name),
      notAfter: now + DAY_S,
    });
  }
}
