import Coordinate from 'jsts/org/locationtech/jts/geom/Coordinate.js';
import GeometryFactory, { type Geometry } from 'jsts/org/locationtech/jts/geom/GeometryFactory.js';
import DistanceOp from 'jsts/org/locationtech/jts/operation/distance/DistanceOp.js';
import RelateOp from 'jsts/org/locationtech/jts/operation/relate/RelateOp.js';

import type { Point } from '../../src/facts.js';

const factory = new GeometryFactory();

function geometry(outline: readonly Point[]): Geometry {
  const [first] = outline;
  if (!first) throw new RangeError('an outline needs corners');
  return factory.createPolygon([...outline, first].map(([x, y]) => new Coordinate(x, y)));
}

/** Least distance of two filled polygons by jsts. */
export const jstsDistance = (a: readonly Point[], b: readonly Point[]): number =>
  DistanceOp.distance(geometry(a), geometry(b));

/** Whether two filled polygons share a point, by the intersection matrix of jsts. */
export const jstsMeet = (a: readonly Point[], b: readonly Point[]): boolean =>
  RelateOp.relate(geometry(a), geometry(b)).isIntersects();
