import { symbol } from '../../book.ts';

/** The member as it is built: places along it, the stretches between them, loads. */
export const member = {
  z: symbol('z', 'distance from end A', 'length'),
  za: symbol('z_a', 'distance of the start of a stretch from end A', 'length'),
  zb: symbol('z_b', 'distance of the end of a stretch from end A', 'length'),
  zlocal: symbol('z', 'distance from the start of the bay', 'length'),
  Lbay: symbol('L_{bay}', 'distance between neighbouring points that are held', 'length'),
  yoff: symbol('y_a', 'distance of the restraint from the shear centre', 'length'),
  w: symbol('w', 'load per length', 'lineLoad'),
  wa: symbol('w_a', 'load per length where the load starts', 'lineLoad'),
  wb: symbol('w_b', 'load per length where the load ends', 'lineLoad'),
  wcut: symbol('w_{cut}', 'load per length where a bay cuts it', 'lineLoad'),
  W: symbol('W', 'point load', 'force'),
  V: symbol('V', 'shear force', 'force'),
  Vr: symbol('V_r', 'required shear strength', 'force'),
  driftRatio: symbol('\\Delta_{2nd}/\\Delta_{1st}', 'second-order over first-order drift'),
  Msup: symbol('M_{(r)}', 'moment over a restraint, bending sense', 'moment'),
} as const;
