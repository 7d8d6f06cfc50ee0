import type { FrameFacts, SheetEntry, ShockFacts } from '@linkfell/fit-engine';

import { readAll, readOne } from './seed-files.js';

/** The demo scenario as it stands in db/seeds, typed. */
export interface Town {
  id: string;
  name: string;
  latitude: number;
  longitude: number;
}
export interface Organisation {
  id: string;
  name: string;
  isShop: boolean;
  isWorkshop: boolean;
  email: string;
  phone: string;
  street: string;
  townId: string;
  postcode: string;
  latitude: number;
  longitude: number;
  timeZone: string;
  vatNumber: string;
  vatRateBp: number;
  dispatchCutoff: string;
  dispatchWeekdays: number[];
  carrierDays: number;
  carriageMinor: number;
  about: string;
}
export interface Workshop {
  organisationId: string;
  stands: string[];
  hours: { weekday: number; opens: string; closes: string }[];
  closures: { firstDay: string; lastDay: string; reason: string }[];
  services: { workId: string; minutes: number; priceMinor: number }[];
}
export interface DemoAccount {
  email: string;
  password: string;
  displayName: string;
  who: string;
  role: 'rider' | 'curator' | 'administrator';
  organisation?: string;
  memberRole?: 'owner' | 'staff' | 'mechanic';
}
export interface Maker {
  id: string;
  name: string;
  makes: 'frames' | 'shocks' | 'parts';
}
export type SheetFacts = Omit<FrameFacts, 'origin' | 'id' | 'name' | 'sheetVersion' | 'entries'>;
export interface Frame {
  id: string;
  makerId: string;
  model: string;
  yearFrom: number;
  yearTo: number;
  reason: string;
  sheet: {
    version: number;
    publishedOn: string;
    facts: SheetFacts;
    entries: (SheetEntry & { sizeKey: string })[];
  };
}
export interface ShockModel {
  id: string;
  makerId: string;
  name: string;
  spring: 'air' | 'coil';
  summary: string;
  /** null where the maker states none. */
  warrantyMonths: number | null;
  inTheBox: string[];
}
interface Item {
  id: string;
  makerId: string;
  name: string;
}
export interface ShockSize extends Item {
  modelId: string;
  sizeKey: string;
  facts: Omit<ShockFacts, 'sizeId' | 'modelName' | 'makerName' | 'sizeKey'>;
}
export interface CoilSpring extends Item {
  rateLbPerIn: number;
  travelMm: number;
  insideMm: number;
  freeLengthMm: number;
}
export interface HardwareKit extends Item {
  boreMm: number;
  widthMm: number;
  boltMm: number;
}
export interface Remote extends Item {
  action: 'pull-to-lock' | 'pull-to-open';
  line: 'cable' | 'hydraulic';
}
export interface Listing {
  shopId: string;
  itemId: string;
  priceMinor: number;
  quantity: number;
  leadDays: number;
}

export const readScenario = () => ({
  towns: readOne<{ towns: Town[] }>('towns').towns,
  organisations: readOne<Organisation[]>('organisations'),
  workshops: readOne<Workshop[]>('workshops'),
  accounts: readOne<DemoAccount[]>('demo-accounts'),
  makers: readOne<Maker[]>('makers'),
  frames: readAll<Frame>('frames'),
  shockModels: readOne<ShockModel[]>('shock-models'),
  shockSizes: readAll<ShockSize>('shocks'),
  coils: readOne<CoilSpring[]>('coil-springs'),
  kits: readOne<HardwareKit[]>('hardware-kits'),
  remotes: readOne<Remote[]>('remotes'),
  holdOpenParts: readOne<Item[]>('hold-open-parts'),
  listings: readAll<Listing>('listings'),
});
export type Scenario = ReturnType<typeof readScenario>;
