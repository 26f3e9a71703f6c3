/** Whether a text could be an e-mail address; the confirmation link finds out whether it is one. */
export const looksLikeEmail = (text: string): boolean => /^[^\s@]+@[^\s@]+\.[^\s@]+$/.test(text.trim());

/** Whether a text could be a telephone number: seven to fifteen digits (ITU-T E.164), however they are set apart. */
export function looksLikePhone(text: string): boolean {
  if (!/^\+?[\d\s().-]+$/.test(text.trim())) return false;
  const digits = text.replace(/\D/g, '').length;
  return digits >= 7 && digits <= 15;
}
