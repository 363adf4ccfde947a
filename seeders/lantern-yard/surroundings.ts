import { asId } from '@/lib/domain/site/ids';
import type { Area, Contact, Course, Network, SharedPoint } from '@/lib/domain/site/site';

export const areas: readonly Area[] = ['Main room', 'Terrace', 'Bar counter'].map((name) => ({ id: asId(name.toLowerCase().replace(' ', '-')), name, version: 1 }));

export const courses: readonly Course[] = ['Drinks', 'Starters', 'Mains', 'Desserts'].map((name) => ({ id: asId(name.toLowerCase()), name }));

export const network: Network = {
  subnet: '10.20.30.0/24', gateway: '10.20.30.1', poolFrom: '10.20.30.100', poolTo: '10.20.30.150',
  reserved: [{ address: '10.20.30.10', reason: 'Music player' }, { address: '10.20.30.20', reason: 'Card terminal at the door' }],
};

export const sharedPoints: readonly SharedPoint[] = [
  { id: asId('kitchen-switch'), name: 'Kitchen switch', kind: 'switch' },
  { id: asId('pastry-switch'), name: 'Pastry switch', kind: 'switch' },
  { id: asId('pass-switch'), name: 'Pass switch', kind: 'switch' },
  { id: asId('bar-switch'), name: 'Bar switch', kind: 'switch' },
  { id: asId('main-room-switch'), name: 'Main room switch', kind: 'switch' },
  { id: asId('terrace-strip'), name: 'Terrace power strip', kind: 'power-strip' },
];

/** Telephone numbers from the range that Ofcom keeps for drama: 01632 960000 to 960999. */
export const contacts: readonly Contact[] = [
  { kind: 'installer', name: 'Femi Lindqvist', phone: '+44 1632 960143', email: 'femi@lindqvist.example' },
  { kind: 'network', name: 'Harbour Fibre, fault desk', phone: '+44 1632 960200', email: 'faults@harbourfibre.example' },
  { kind: 'electrician', name: 'Oona Brisk', phone: '+44 1632 960318', email: 'oona@briskelectric.example' },
];
