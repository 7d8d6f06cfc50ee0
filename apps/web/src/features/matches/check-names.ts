import type { CheckView } from '@linkfell/contracts';

/** The checks in trade words. */
export const checkNames: Record<CheckView['check'], string> = {
  'eye-to-eye': 'Eye-to-eye',
  stroke: 'Stroke',
  mounts: 'Mounts',
  hardware: 'Hardware',
  'spring-type': 'Kind of spring',
  'coil-on-yoke': 'Coil on a yoke',
  'spring-rate': 'Spring rate',
  pressure: 'Air pressure',
  'rider-weight': 'Rider weight',
  reservoir: 'Reservoir',
  diameter: 'Diameter',
  remote: 'Remote',
  position: 'Way round',
  'e-bike': 'E-bike',
  notices: 'Recalls and notices',
  'reading-conflict': 'Reading and sheet',
};
