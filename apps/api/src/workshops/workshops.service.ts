import type { WorkId } from '@linkfell/contracts';
import { Injectable } from '@nestjs/common';
import { DataSource, type EntityManager } from 'typeorm';

import { fromRangeText } from '../database/time-range.js';
import type { WorkshopCalendar } from '../plans/planning/calendar.js';
import type { BusyStand } from '../plans/planning/free-slots.js';
import type { Place } from './great-circle.js';

/** A workshop with all that planning needs to know of it. */
export interface WorkshopDay extends Place {
  id: string;
  name: string;
  email: string;
  phone: string;
  town: string;
  street: string;
  postcode: string;
  vatNumber: string;
  vatRateBp: number;
  calendar: WorkshopCalendar;
  stands: string[];
  services: Map<WorkId, { minutes: number; priceMinor: number }>;
  busy: BusyStand[];
}

interface Row {
  id: string;
  name: string;
  email: string;
  phone: string;
  town: string;
  street: string;
  postcode: string;
  vat_number: string;
  vat_rate_bp: number;
  latitude: number;
  longitude: number;
  time_zone: string;
  stands: string[];
  hours: WorkshopCalendar['hours'];
  closures: WorkshopCalendar['closures'];
  services: { workId: WorkId; minutes: number; priceMinor: number }[];
  busy: { standId: string; during: string }[];
}

/** One statement for all workshops, since every page that shows a date needs all of them. */
const sql = `
  SELECT o.id, o.name, o.email, o.phone, t.name AS town, o.street, o.postcode, o.vat_number, o.vat_rate_bp,
         o.latitude, o.longitude, o.time_zone,
         ARRAY(SELECT s.id FROM stands s WHERE s.organisation_id = o.id ORDER BY s.id) AS stands,
         (SELECT coalesce(json_agg(json_build_object('weekday', weekday, 'opens', opens, 'closes', closes)), '[]')
            FROM workshop_hours h WHERE h.organisation_id = o.id) AS hours,
         (SELECT coalesce(json_agg(json_build_object('firstDay', first_day, 'lastDay', last_day)), '[]')
            FROM workshop_closures c WHERE c.organisation_id = o.id) AS closures,
         (SELECT coalesce(json_agg(json_build_object('workId', work_id, 'minutes', minutes, 'priceMinor', price_minor)), '[]')
            FROM workshop_services v WHERE v.organisation_id = o.id) AS services,
         (SELECT coalesce(json_agg(json_build_object('standId', b.stand_id, 'during', b.during::text)), '[]')
            FROM bookings b WHERE b.workshop_id = o.id AND upper(b.during) > $1
             AND b.state IN ('held','requested','accepted','fitted')) AS busy
    FROM organisations o JOIN towns t ON t.id = o.town_id
   WHERE o.is_workshop AND ($2::text IS NULL OR o.id = $2)
   ORDER BY o.id`;

@Injectable()
export class WorkshopsService {
  constructor(private readonly dataSource: DataSource) {}

  /** All workshops, or one, with the bookings that are still to come at `now`. */
  async days(
    now: Date,
    manager: EntityManager = this.dataSource.manager,
    only: string | null = null,
  ): Promise<WorkshopDay[]> {
    const rows: Row[] = await manager.query(sql, [now, only]);
    return rows.map((row) => ({
      id: row.id,
      name: row.name,
      email: row.email,
      phone: row.phone,
      town: row.town,
      street: row.street,
      postcode: row.postcode,
      vatNumber: row.vat_number,
      vatRateBp: row.vat_rate_bp,
      latitude: row.latitude,
      longitude: row.longitude,
      calendar: { timeZone: row.time_zone, hours: row.hours, closures: row.closures },
      stands: row.stands,
      services: new Map(row.services.map(({ workId, ...rest }) => [workId, rest])),
      busy: row.busy.map(({ standId, during }) => ({ standId, ...fromRangeText(during) })),
    }));
  }
}
