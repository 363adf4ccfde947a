/** The hexadecimal digits alone, in the four ways stickers and routers print them. */
const forms = [
  /^[0-9a-f]{12}$/i,
  /^[0-9a-f]{2}(:[0-9a-f]{2}){5}$/i,
  /^[0-9a-f]{2}(-[0-9a-f]{2}){5}$/i,
  /^[0-9a-f]{4}(\.[0-9a-f]{4}){2}$/i,
];

export type ParsedMac =
  /** "00:1B:44:11:3A:B7" */
  | { readonly ok: true; readonly value: string }
  | { readonly ok: false; readonly reason: string };

/** Reads a device's hardware address (IEEE 802) and writes it one way, so that two can be compared. */
export const parseMac = (text: string): ParsedMac => {
  const trimmed = text.trim();
  if (!forms.some((form) => form.test(trimmed))) {
    return { ok: false, reason: 'A MAC address is six pairs of 0-9 and A-F, for example 00:1B:44:11:3A:B7. It is on the sticker and on the self-test.' };
  }
  const digits = trimmed.replace(/[:.-]/g, '').toUpperCase();
  if (/^(0{12}|F{12})$/.test(digits)) return { ok: false, reason: 'All zeros and all Fs belong to no device. Read the MAC address from the sticker or the self-test.' };
  // IEEE 802: the lowest bit of the first octet marks a group, which no device's own address has.
  if ((parseInt(digits.slice(0, 2), 16) & 1) === 1) return { ok: false, reason: 'This is the address of a group, not of one device. Read the MAC address from the sticker or the self-test.' };
  return { ok: true, value: (digits.match(/../g) ?? []).join(':') };
};

export const isValidMac = (text: string): boolean => parseMac(text).ok;

/** The one way of writing it, or null. */
export const normaliseMac = (text: string): string | null => {
  const parsed = parseMac(text);
  return parsed.ok ? parsed.value : null;
};
