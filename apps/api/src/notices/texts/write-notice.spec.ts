import { atLeast, exactly } from '@lidwatch/atmosphere';
import type { NoticeFacts } from './notice-facts';
import { smsSize } from './sms-segments';
import { writeNotice } from './write-notice';

const facts: NoticeFacts = {
  act: 'begin',
  kind: 'burnBan',
  ref: 'MF-26-017',
  officeName: 'Pellworth Clean Air Office',
  district: {
    name: 'Mill Flats',
    slug: 'mill-flats',
    timeZone: 'America/Denver',
    ordinanceRef: '8.12',
    phone: '208 555 0142',
  },
  expiresAt: Date.parse('2026-01-15T18:00:00Z') / 1000,
  strengthC: atLeast(5.1),
  publicUrl: 'https://air.pellworth.example',
};

describe('the words of a notice', () => {
  it('says what, where, until when in the district’s own time, and by which reference', () => {
    const { en, es } = writeNotice(facts);
    expect(en.subject).toBe('Burn ban in Mill Flats (MF-26-017)');
    expect(en.public.untilText).toBe(
      'Do not light stoves, fireplaces or outdoor fires until Thursday 15 January, 11:00 MST.',
    );
    expect(es.public.untilText).toContain('hasta el jueves 15 de enero, 11:00 MST');
    expect(en.mailText).toContain('https://air.pellworth.example/d/mill-flats');
    expect(es.mailText).toContain('https://air.pellworth.example/d/mill-flats?lang=es');
  });

  it('says "at least" where the tower ends inside the warm air, and the number where it does not', () => {
    expect(writeNotice(facts).en.public.why).toContain('at least 5 °C warmer');
    expect(writeNotice({ ...facts, strengthC: exactly(4.4) }).en.public.why).toContain('It is 4 °C warmer');
    expect(writeNotice({ ...facts, strengthC: undefined }).en.public.why).not.toContain('°C');
  });

  it('carries the exemption, carbon monoxide, the ordinance and the way to leave in every mail', () => {
    for (const { mailText, mailHtml } of Object.values(writeNotice(facts))) {
      for (const text of [mailText, mailHtml]) {
        expect(text).toMatch(/only source of heat|única calefacción/);
        expect(text).toMatch(/Carbon monoxide kills|monóxido de carbono mata/);
        expect(text).toContain('8.12');
        expect(text).toContain('{manageUrl}');
      }
    }
  });

  it.each(['burnBan', 'advisory'] as const)('%s fits two parts of GSM-7 in both languages', (kind) => {
    for (const act of ['begin', 'end'] as const) {
      for (const { sms } of Object.values(writeNotice({ ...facts, kind, act }))) {
        expect(smsSize(sms).encoding).toBe('GSM-7');
        expect(smsSize(sms).segments).toBeLessThanOrEqual(2);
        expect(sms).toContain('MF-26-017');
      }
    }
  });

  it('never calls the air clean or clear when a notice ends', () => {
    for (const text of Object.values(writeNotice({ ...facts, act: 'end' })))
      expect(JSON.stringify(text)).not.toMatch(/clean air (now|again)|all clear|aire limpio/i);
  });

  it('makes names safe in HTML', () => {
    const hostile = { ...facts, district: { ...facts.district, name: '<b>Mill & "Flats"</b>' } };
    expect(writeNotice(hostile).en.mailHtml).not.toContain('<b>Mill');
  });
});
