import { Injectable } from '@nestjs/common';
import { ActivityService } from '../activity/activity.service';
import { UnitOfWork } from '../database/unit-of-work';
import { OfficeService } from '../office/office.service';
import { normalPhone } from '../subscribers/addresses';
import { ContactsService } from '../subscribers/contacts.service';
import { ManageLinks } from '../subscribers/manage-links';
import { WishesService } from '../subscribers/wishes.service';

/** Words that end it, begin it again, or ask for help; common carrier practice, with Spanish ones of our own. */
const STOP = new Set([
  'STOP',
  'STOPALL',
  'UNSUBSCRIBE',
  'CANCEL',
  'END',
  'QUIT',
  'REVOKE',
  'ALTO',
  'PARAR',
  'BAJA',
]);
const START = new Set(['START', 'UNSTOP', 'YES', 'INICIAR', 'ALTA']);

/** What residents text to us. Each word is answered with one text; anything else with how to get help. */
@Injectable()
export class IncomingTextsService {
  constructor(
    private readonly contacts: ContactsService,
    private readonly wishes: WishesService,
    private readonly office: OfficeService,
    private readonly links: ManageLinks,
    private readonly activity: ActivityService,
    private readonly work: UnitOfWork,
  ) {}

  /** Takes a text and gives the answer to send back. */
  async take(from: string, body: string): Promise<string> {
    const word = body
      .trim()
      .toUpperCase()
      .replace(/[^\p{L}]/gu, '');
    const { name, phone } = await this.office.get();
    const address = normalPhone(from);
    if (address && STOP.has(word)) return this.stop(address, word, name);
    if (address && START.has(word)) return this.start(address, word, name);
    const known = address && (await this.contacts.byAddress('sms', address));
    const manage = known ? ` Change or leave: ${this.links.urlOf(known.personId)}` : '';
    return `${name}: text STOP to leave, START to come back.${phone ? ` Questions: ${phone}.` : ''}${manage}`;
  }

  private async stop(address: string, word: string, office: string): Promise<string> {
    await this.work.run(async () => {
      const personId = await this.contacts.stopByAddress('sms', address, `the recipient texted ${word}`);
      if (personId !== undefined) await this.keep(personId, 'stopped', word);
    });
    return `${office}: you get no more texts from us. START to come back. / No recibira mas mensajes.`;
  }

  private async start(address: string, word: string, office: string): Promise<string> {
    const personId = await this.work.run(async () => {
      const found = await this.contacts.resumeByAddress('sms', address);
      if (found !== undefined) await this.keep(found, 'resumed', word);
      return found;
    });
    return personId === undefined
      ? `${office}: we do not know this number. Subscribe on our page.`
      : `${office}: you get our texts again. STOP to leave. / Recibira mensajes de nuevo.`;
  }

  private async keep(personId: number, act: string, word: string): Promise<void> {
    await this.wishes.keepConsent(personId, act, word, 'text message');
    await this.activity.record({
      actor: 'service',
      act: `a resident ${act} texts`,
      subject: `person ${personId}`,
    });
  }
}
