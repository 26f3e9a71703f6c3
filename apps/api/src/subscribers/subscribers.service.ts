import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import { maskedAddress } from '../common/masked-address';
import { Problem } from '../common/problem';
import { Sql } from '../database/sql';
import { UnitOfWork } from '../database/unit-of-work';
import { normalEmail, normalPhone, type Channel } from './addresses';
import { ContactsService } from './contacts.service';
import type {
  ConfirmedDto,
  SubscriptionReceipt,
  SubscriptionRequest,
  SubscriptionView,
} from './dto/subscription.dto';
import type { SubscriptionPatch } from './dto/subscription-patch.dto';
import { ManageLinks } from './manage-links';
import { SubscriptionMessages } from './subscription-messages';
import { WishesService } from './wishes.service';
import { CONSENT_TEXT } from './words/consent';

type Address = readonly [Channel, string];

/** Residents who want to be told: how they come, confirm, change their wishes and leave. */
@Injectable()
export class SubscribersService {
  constructor(
    private readonly sql: Sql,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
    private readonly contacts: ContactsService,
    private readonly wishes: WishesService,
    private readonly links: ManageLinks,
    private readonly messages: SubscriptionMessages,
  ) {}

  /**
   * Takes a request and writes to each address it names: a link to confirm, or, to an address that is subscribed
   * already, the link to its own page. The answer is the same in every case.
   */
  async subscribe(request: SubscriptionRequest): Promise<SubscriptionReceipt> {
    const addresses = readAddresses(request);
    const districtIds = await this.wishes.districtIds(request.districtSlugs);
    await this.work.run(async () => {
      const unknown: Address[] = [];
      for (const address of addresses) {
        const known = await this.contacts.byAddress(...address);
        if (!known) unknown.push(address);
        else if (known.confirmedAt !== null) await this.messages.sendManage(known, request.lang);
        else await this.messages.sendConfirm(known.id, known.channel, request.lang);
      }
      if (unknown.length === 0) return;
      const personId = await this.wishes.addPerson(request.lang, districtIds, request.kinds);
      await this.wishes.keepConsent(personId, 'asked', CONSENT_TEXT[request.lang], 'public page');
      for (const [channel, address] of unknown) {
        const id = await this.contacts.add(personId, channel, address);
        await this.messages.sendConfirm(id, channel, request.lang);
      }
    });
    return { message: 'We have written to you. Open the link in the message to confirm.' };
  }

  /** Confirms an address by the token of its link; 410 when it is unknown or too old. */
  confirm(token: string): Promise<ConfirmedDto> {
    return this.work.run(async () => {
      const contact = await this.contacts.confirm(token);
      if (!contact)
        throw new Problem(
          'link-not-valid',
          'This link is too old or was not copied whole. Subscribe again for a new one.',
        );
      if (contact.confirmedAt === null)
        await this.wishes.keepConsent(
          contact.personId,
          'confirmed',
          `${contact.channel} confirmed by link`,
          'link',
        );
      return { manageToken: this.links.tokenOf(contact.personId) };
    });
  }

  /** A subscriber's own page; 410 when the link is not theirs or they have left. */
  async view(token: string): Promise<SubscriptionView> {
    const personId = this.personOf(token);
    const wishes = await this.wishes.of(personId);
    if (!wishes) throw new Problem('link-not-valid', 'You have left; nothing is sent to you any more.');
    const contacts = await this.contacts.ofPerson(personId);
    return {
      ...wishes,
      contacts: contacts.map(({ channel, address, confirmedAt }) => ({
        channel,
        address: maskedAddress(channel, address),
        confirmed: confirmedAt !== null,
      })),
    };
  }

  /** Changes a subscriber's wishes. */
  async change(token: string, patch: SubscriptionPatch): Promise<SubscriptionView> {
    const before = await this.view(token);
    const personId = this.personOf(token);
    const after = { ...before, ...patch };
    const districtIds = await this.wishes.districtIds(after.districtSlugs);
    await this.work.run(async () => {
      await this.wishes.set(personId, districtIds, after.kinds);
      await this.wishes.setLanguage(personId, after.lang);
      await this.wishes.keepConsent(personId, 'changed', JSON.stringify(patch), 'own page');
    });
    return this.view(token);
  }

  /** Ends a subscription and forgets its addresses. A second time changes nothing and is fine. */
  async leave(token: string, origin: string): Promise<void> {
    const personId = this.personOf(token);
    await this.work.run(async () => {
      const left = await this.sql.run('UPDATE person SET left_at = $2 WHERE id = $1 AND left_at IS NULL', [
        personId,
        this.clock.now(),
      ]);
      if (left === 0) return;
      await this.contacts.forget(personId);
      await this.wishes.keepConsent(personId, 'left', '', origin);
    });
  }

  private personOf(token: string): number {
    const personId = this.links.personOf(token);
    if (personId !== undefined) return personId;
    throw new Problem('link-not-valid', 'This link was not copied whole. Open it again from the message.');
  }
}

/** The addresses of a request in the form they are kept in; 422 beside the field that cannot be read. */
function readAddresses({ email, phone }: SubscriptionRequest): Address[] {
  const given: [field: string, channel: Channel, text: string, normal: string | undefined, cure: string][] =
    [];
  if (email?.trim())
    given.push(['email', 'email', email, normalEmail(email), 'Write it like name@example.org.']);
  if (phone?.trim())
    given.push([
      'phone',
      'sms',
      phone,
      normalPhone(phone),
      'Write it like 208 555 0142, or with + and the country code.',
    ]);
  const unread = given.filter(([, , , normal]) => normal === undefined);
  if (unread.length > 0)
    throw new Problem('invalid', 'An address could not be read.', {
      errors: unread.map(([field, , , , cure]) => ({ field, text: cure })),
    });
  if (given.length > 0) return given.map(([, channel, , normal]) => [channel, normal!] as const);
  throw new Problem('invalid', 'Give an e-mail address, a telephone number, or both.', {
    errors: [{ field: 'email', text: 'Give an e-mail address or a telephone number.' }],
  });
}
