import type { MailBehaviour, MailMode } from '../mail/mail-behaviour';
import type { NumberOrder, TextBehaviour, TextMode } from '../sms/text-behaviour';

/** An order that cannot be carried out; its message names the field and the cure. */
export class BadOrder extends Error {}

const MAIL_MODES: readonly MailMode[] = ['ok', 'refuse', 'error', 'slow', 'drop'];
const TEXT_MODES: readonly TextMode[] = ['ok', 'refuse', 'error', 'tooMany', 'slow', 'drop'];
const USUAL_DELAY_MS = 1000;

type Body = Record<string, unknown>;

const known = (body: Body, names: readonly string[]): void => {
  const stranger = Object.keys(body).find((name) => !names.includes(name));
  if (stranger) throw new BadOrder(`"${stranger}" is not an order. These are: ${names.join(', ')}.`);
};

const mode = <M extends string>(body: Body, modes: readonly M[], now: M): M => {
  if (body.mode === undefined) return now;
  if (!modes.includes(body.mode as M))
    throw new BadOrder(`"mode" is ${JSON.stringify(body.mode)}: give one of ${modes.join(', ')}.`);
  return body.mode as M;
};

const amount = (body: Body, name: string, highest: number): number | undefined => {
  const value = body[name];
  if (value === undefined || value === null) return undefined;
  if (typeof value !== 'number' || !(value >= 0 && value <= highest))
    throw new BadOrder(`"${name}" is ${JSON.stringify(value)}: give a number from 0 to ${highest}.`);
  return value;
};

const record = (body: Body, name: string): Record<string, unknown> | undefined => {
  const value = body[name];
  if (value === undefined) return undefined;
  if (typeof value !== 'object' || value === null || Array.isArray(value))
    throw new BadOrder(`"${name}" must be an object.`);
  return value as Record<string, unknown>;
};

/**
 * Changes the mail server's orders: `{mode, delayMs, times, recipients: {address: SMTP code}}`; what is left out stays
 * (`times` belongs to the mode it is given with).
 */
export const orderMail = (behaviour: MailBehaviour, body: Body): MailBehaviour => {
  known(body, ['mode', 'delayMs', 'times', 'recipients']);
  const recipients = record(body, 'recipients');
  for (const code of Object.values(recipients ?? {}))
    if (typeof code !== 'number' || code < 400 || code > 599)
      throw new BadOrder('"recipients" gives each address an SMTP code from 400 to 599.');
  behaviour.mode = mode(body, MAIL_MODES, behaviour.mode);
  behaviour.delayMs = amount(body, 'delayMs', 600_000) ?? (behaviour.delayMs || USUAL_DELAY_MS);
  if (body.mode !== undefined) behaviour.times = amount(body, 'times', 1e9);
  if (recipients)
    behaviour.recipients = Object.fromEntries(
      Object.entries(recipients).map(([to, code]) => [to.toLowerCase(), code as number]),
    );
  return behaviour;
};

/** Changes the text service's orders: `{mode, delayMs, times, numbers: {number: {refuseCode | end, errorCode}}, undeliveredShare, statusDelayMs}`. */
export const orderTexts = (behaviour: TextBehaviour, body: Body): TextBehaviour => {
  known(body, ['mode', 'delayMs', 'times', 'numbers', 'undeliveredShare', 'statusDelayMs']);
  const numbers = record(body, 'numbers') as Record<string, NumberOrder> | undefined;
  for (const [number, order] of Object.entries(numbers ?? {})) {
    known(order as Body, ['refuseCode', 'end', 'errorCode']);
    if (order.end !== undefined && order.end !== 'undelivered' && order.end !== 'failed')
      throw new BadOrder(
        `"numbers"["${number}"].end is ${JSON.stringify(order.end)}: give undelivered or failed.`,
      );
  }
  behaviour.mode = mode(body, TEXT_MODES, behaviour.mode);
  behaviour.delayMs = amount(body, 'delayMs', 600_000) ?? (behaviour.delayMs || USUAL_DELAY_MS);
  if (body.mode !== undefined) behaviour.times = amount(body, 'times', 1e9);
  behaviour.undeliveredShare = amount(body, 'undeliveredShare', 1) ?? behaviour.undeliveredShare;
  behaviour.statusDelayMs = amount(body, 'statusDelayMs', 600_000) ?? behaviour.statusDelayMs;
  if (numbers) behaviour.numbers = numbers;
  return behaviour;
};
