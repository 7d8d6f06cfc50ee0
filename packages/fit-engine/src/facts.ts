/**
 * What the engine is told. Lengths in mm, masses in kg, rates in N/mm, pressures in kPa (gauge where the name says so).
 * `null` always means "not known"; it never means zero, none or allowed.
 */

/** Where a figure came from; shown beside it wherever it is used. */
export interface Source {
  kind: 'maker' | 'print' | 'rider' | 'curator' | 'practice' | 'computed';
  /** For people, e.g. "Ullscar workshop manual, page 14". */
  label: string;
  /** ISO date on which it was published, read or measured. */
  date: string | null;
}

export interface Sourced<T> {
  value: T;
  source: Source;
}
export type Fact<T> = Sourced<T> | null;

// ---------------------------------------------------------------- mounts

/** One end of a shock. */
export type ShockMount =
  | { kind: 'eyelet'; boreMm: number }
  | { kind: 'bearing-eye'; boltMm: number; widthMm: number }
  | { kind: 'trunnion' };

/** What the frame offers one end of a shock. */
export type FrameMount =
  | { kind: 'hardware'; widthMm: number | null; boltMm: number | null }
  | { kind: 'pin'; diameterMm: number | null; widthMm: number | null }
  | { kind: 'bearing-bolt'; boltMm: number | null; widthMm: number | null }
  | { kind: 'trunnion' };

export interface FrameEnd {
  mount: FrameMount;
  /** Fork-shaped extender between shock and linkage. */
  yoke: boolean | null;
  /** Thread as the sheet prints it, e.g. "M8"; never guessed from the bolt diameter. */
  thread: string | null;
  /** Torque as printed, N m. */
  torqueNm: number | null;
  /** Standard uncertainty of the mount's lengths: 0 for published nominals, a rider's reading otherwise. */
  uncertaintyMm: number;
  source: Source;
}

// ---------------------------------------------------------------- frame

export interface LeverageTable {
  by: 'shock-travel' | 'wheel-travel';
  /** [travel mm, leverage ratio], strictly increasing, starting at 0. */
  points: readonly (readonly [number, number])[];
}

/** One line of a frame sheet: figures that belong together. Figures of different entries never mix. */
export interface SheetEntry {
  id: string;
  /** null only for a frame described by the rider. */
  sizeKey: string | null;
  frameEnd: FrameEnd | null;
  linkEnd: FrameEnd | null;
  travelMm: number | null;
  curve: LeverageTable | null;
  modelYears: { from: number; to: number } | null;
  frameSizes: readonly string[] | null;
  chip: string | null;
  source: Source;
}

export type Point = readonly [number, number];

/** A part of the frame in its plane: origin at the frame-side pivot, x to the link-side eye at full extension, y 90 degrees anticlockwise, drive side. */
export interface FrameOutline {
  name: string;
  polygon: readonly Point[];
  toleranceMm: number;
  /** Poses over shock travel for a moving part: [shock travel mm, x mm, y mm, degrees]; null = fixed. */
  poses: readonly (readonly [number, number, number, number])[] | null;
  /** A moving part without poses makes the answer "not known". */
  moves: boolean;
}

export interface FrameRoom {
  outlines: readonly FrameOutline[];
  /** [shock travel mm, degrees] of the shock about the frame-side pivot. */
  swing: readonly (readonly [number, number])[];
}

export interface MakerNotice {
  id: string;
  title: string;
  effect: 'stop' | 'remark';
  source: Source;
}

export interface FrameFacts {
  origin: 'sheet' | 'described';
  id: string;
  name: string;
  sheetVersion: number | null;
  /** A described frame has exactly one entry, with sizeKey null. */
  entries: readonly SheetEntry[];
  springStatement: Fact<'air-and-coil' | 'air-only' | 'coil-only'>;
  /** Maker's word on a coil shock with this frame's yoke. */
  coilOnYoke: Fact<'allowed' | 'refused'>;
  tunnelWidthMm: Fact<number>;
  /** Maker's plain statement. */
  reservoirStatement: Fact<'fits' | 'inline-only'>;
  /** Room measured by the rider where the reservoir would sit; diameter across, length along. */
  reservoirRoom: Fact<{ diameterMm: number; lengthMm: number; uncertaintyMm: number }>;
  room: FrameRoom | null;
  cableRouting: Fact<'internal' | 'external' | 'none'>;
  eBike: Fact<boolean>;
  riderLimit: Fact<WeightLimit>;
  /** Which way round the maker wants the shock; null = no rule. */
  wayRound: Fact<'body-to-frame' | 'body-to-link'>;
  /** Turned positions of a reservoir or valve the maker refuses, degrees about the shock axis. */
  refusedPositions: Fact<readonly number[]>;
  /** Printed sag target at the shock, %; wins over the style's window. */
  sagTargetPercent: Fact<number>;
  notices: readonly MakerNotice[];
}

export interface WeightLimit {
  kg: number;
  basis: 'rider' | 'rider-and-kit' | 'with-bike' | null;
}

// ---------------------------------------------------------------- shock on sale

export interface AirChambers {
  areaMm2: number;
  negativeAreaMm2: number;
  volumeMm3: number;
  negativeVolumeMm3: number;
}

export type ShockSpring =
  | {
      kind: 'air';
      minGaugeKPa: number | null;
      maxGaugeKPa: number | null;
      chambers: Sourced<AirChambers> | null;
    }
  | {
      kind: 'coil';
      /** Inside diameter of the springs it takes and the longest one, mm. */
      springInsideMm: number;
      maxFreeLengthMm: number;
      collarPitchMm: number | null;
    };

export interface Reservoir {
  lengthMm: number;
  diameterMm: number;
  /** Positions it can be turned to, degrees about the shock axis; [0] = fixed. */
  positionsDeg: readonly number[];
  /** Outline of body with reservoir for each position, in the shock's axes (x from the body-end eye). */
  outlines: readonly { positionDeg: number; polygon: readonly Point[] }[];
}

export interface ShockFacts {
  sizeId: string;
  modelName: string;
  makerName: string;
  sizeKey: string;
  /** Size keys that the maker's travel spacers reach from this one (shorter strokes). */
  spacedToKeys: readonly string[];
  bodyEnd: ShockMount;
  shaftEnd: ShockMount;
  spring: ShockSpring;
  /** Widest part across the frame's tunnel: can, or coil outside diameter. */
  diameterMm: number;
  reservoir: Reservoir | null;
  remote: null | {
    action: 'pull-to-lock' | 'pull-to-open';
    line: 'cable' | 'hydraulic';
    /** Part of the maker that holds a pull-to-open shock open without a lever. */
    holdOpenPartId: string | null;
  };
  eBikeApproved: Fact<boolean>;
  riderLimit: Fact<WeightLimit>;
  wayRound: Fact<'body-to-frame' | 'body-to-link'>;
  tune: 'low' | 'middle' | 'high' | null;
  massG: number;
  serviceHours: number | null;
  notices: readonly MakerNotice[];
  source: Source;
}

// ---------------------------------------------------------------- parts on sale

export interface KitOnSale {
  id: string;
  name: string;
  /** Eye bore it presses into. */
  boreMm: number;
  widthMm: number;
  boltMm: number;
}
export interface CoilOnSale {
  id: string;
  name: string;
  rateNPerMm: number;
  /** Label rate, lb/in. */
  rateLbPerIn: number;
  travelMm: number;
  insideMm: number;
  freeLengthMm: number;
}
export interface RemoteOnSale {
  id: string;
  name: string;
  action: 'pull-to-lock' | 'pull-to-open';
  line: 'cable' | 'hydraulic';
}
export interface PartsOnSale {
  kits: readonly KitOnSale[];
  coils: readonly CoilOnSale[];
  remotes: readonly RemoteOnSale[];
  /** Ids of other makers' parts on sale (e.g. hold-open parts). */
  otherPartIds: readonly string[];
}

// ---------------------------------------------------------------- rider

export type Tool = 'print' | 'caliper' | 'ruler' | 'tape';
export interface Reading {
  mm: number;
  tool: Tool;
  /** In the frame, or across eyes turned against each other: adds 0.5 mm in quadrature. */
  awkward: boolean;
}
export interface HardwareSeen {
  boreMm: number | null;
  widthMm: number;
  boltMm: number;
  /** Inspected and without play or damage; null = not looked at. */
  sound: boolean | null;
}
export interface PresentShock {
  /** Size printed on it or on its invoice, as a size key. */
  printedSizeKey: string | null;
  eyeToEye: Reading | null;
  /** Eye-to-eye with all air out, pushed together. */
  compressed: Reading | null;
  /** Shaft travel by O-ring. */
  shaftTravel: Reading | null;
  bodyEndKind: ShockMount['kind'] | null;
  shaftEndKind: ShockMount['kind'] | null;
  frameEndHardware: HardwareSeen | null;
  linkEndHardware: HardwareSeen | null;
  diameterMm: number | null;
  spring: 'air' | 'coil' | null;
  remoteAction: 'pull-to-lock' | 'pull-to-open' | 'none' | null;
  remoteLine: 'cable' | 'hydraulic' | null;
  soldWithBike: 'yes' | 'no' | 'unsure' | null;
}

export type RidingStyle = 'cross-country' | 'trail' | 'enduro' | 'downhill';

export interface RiderFacts {
  riderKg: number | null;
  kitKg: number | null;
  bikeKg: number | null;
  style: RidingStyle | null;
  modelYear: number | null;
  frameSize: string | null;
  chip: string | null;
  springWish: 'air' | 'coil' | 'either';
  reservoirWish: 'with' | 'without' | 'either';
  /** true: the shock must be worked from the bar. */
  wantsRemote: boolean | null;
  acceptsExternalRouting: boolean | null;
  /** The rider has confirmed the sheet's size against a settled reading that disagrees. */
  confirmsSheetSize: boolean;
  /** Geopotential height of the filling place, m. */
  fillingHeightM: number;
}

/** Everything one judgement needs. */
export interface FitQuestion {
  frame: FrameFacts;
  present: PresentShock;
  rider: RiderFacts;
  shock: ShockFacts;
  sale: PartsOnSale;
}
