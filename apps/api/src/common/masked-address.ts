/** An address for people who need not know it: `m…@pellworth.example`, `… 42`. */
export function maskedAddress(channel: 'email' | 'sms', address: string | null): string {
  if (!address) return 'forgotten';
  if (channel === 'sms') return `… ${address.slice(-2)}`;
  const [local = '', domain = ''] = address.split('@');
  return `${local.slice(0, 1)}…@${domain}`;
}
