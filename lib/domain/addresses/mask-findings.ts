import type { Finding, Fix, Subject } from '../findings/finding';
import { isHoledMask, isValidMask } from './masks';

type Masked = { readonly name: string; readonly mask: string; readonly subject: Subject; readonly offer: (mask: string) => Fix };

type MaskRule = {
  readonly code: string;
  readonly applies: (mask: string, siteMask: string | null) => boolean;
  readonly title: (name: string, mask: string) => string;
  readonly message: (siteMask: string | null) => string;
};

const shouldBe = (siteMask: string | null): string => (siteMask === null ? '' : ` The site's is ${siteMask}.`);

const rules: readonly MaskRule[] = [
  {
    code: 'mask-missing',
    applies: (mask) => mask === '',
    title: (name) => `${name} has no mask yet`,
    message: (siteMask) => `Without it the device does not know which addresses are near.${shouldBe(siteMask)}`,
  },
  {
    code: 'mask-holed', // RFC 4632 5.1
    applies: isHoledMask,
    title: (name, mask) => `${name} has ${mask}, which is not a mask`,
    message: (siteMask) => `Written as bits, a mask is ones first and then only zeros.${shouldBe(siteMask)}`,
  },
  {
    code: 'mask-form',
    applies: (mask) => !isValidMask(mask),
    title: (name, mask) => `${name} has ${mask.trim()}, which is not a mask`,
    message: (siteMask) => `A mask is written like an address, for example 255.255.255.0.${shouldBe(siteMask)}`,
  },
  {
    code: 'mask-differs',
    applies: (mask, siteMask) => siteMask !== null && mask !== siteMask,
    title: (name) => `${name} has another mask than the site`,
    message: (siteMask) => `With a wrong mask one direction breaks: what is sent arrives, and the answer does not, or the other way round.${shouldBe(siteMask)}`,
  },
];

export const maskFinding = (device: Masked, siteMask: string | null): readonly Finding[] => {
  const rule = rules.find((one) => one.applies(device.mask, siteMask));
  if (rule === undefined) return [];
  return [{
    code: rule.code, severity: 'stop', subject: { ...device.subject, field: 'mask' },
    title: rule.title(device.name, device.mask), message: rule.message(siteMask),
    fixes: siteMask === null ? [] : [device.offer(siteMask)],
  }];
};
