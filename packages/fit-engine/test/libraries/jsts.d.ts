/** The few parts of jsts that the tests call; the package brings no types. */
declare module 'jsts/org/locationtech/jts/geom/Coordinate.js' {
  export default class Coordinate {
    constructor(x: number, y: number);
  }
}
declare module 'jsts/org/locationtech/jts/geom/GeometryFactory.js' {
  import type Coordinate from 'jsts/org/locationtech/jts/geom/Coordinate.js';
  export interface Geometry {
    isEmpty(): boolean;
  }
  export default class GeometryFactory {
    createPolygon(ring: readonly Coordinate[]): Geometry;
  }
}
declare module 'jsts/org/locationtech/jts/operation/distance/DistanceOp.js' {
  import type { Geometry } from 'jsts/org/locationtech/jts/geom/GeometryFactory.js';
  export default class DistanceOp {
    static distance(a: Geometry, b: Geometry): number;
  }
}
declare module 'jsts/org/locationtech/jts/operation/relate/RelateOp.js' {
  import type { Geometry } from 'jsts/org/locationtech/jts/geom/GeometryFactory.js';
  export default class RelateOp {
    static relate(a: Geometry, b: Geometry): { isIntersects(): boolean };
  }
}
