import type { OrderType } from '../site/order-types';
import type { AddressSource, PortKind, TillKind, TillSystem } from '../site/till';

export const kindWords: Readonly<Record<TillKind, string>> = { fixed: 'Fixed till', handheld: 'Handheld', online: 'Online channel' };
export const systemWords: Readonly<Record<TillSystem, string>> = { windows: 'Windows', linux: 'Linux', other: 'Other' };
export const sourceWords: Readonly<Record<AddressSource, string>> = { static: 'Fixed, typed in', dhcp: 'From the router', 'dhcp-reserved': 'From the router, reserved' };
export const portWords: Readonly<Record<PortKind, string>> = { tcp: 'Network', usb: 'USB', parallel: 'Parallel', shared: 'Shared by another computer' };
export const orderTypeLabels: Readonly<Record<OrderType, string>> = { 'eat-in': 'To eat in', 'take-away': 'To take away', delivery: 'For delivery' };
