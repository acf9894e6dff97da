import { byOrder, type Order } from './transfer.ts';
import { formula } from './writer.ts';

/*
 * Shear at the start of a bay: first the part of the end moments, then the part of each load as on a
 * simply supported bay, added one by one. First order is the limit of the other two for k = 0.
 * ∫ q(ζ) sin k(L − ζ) dζ / sin kL; S. P. Timoshenko, J. M. Gere, Theory of Elastic Stability, 2nd ed.,
 * McGraw-Hill 1961, chapter 1; from memory.
 */
const ENDS: Readonly<Record<Order, string>> = {
  first: '(MB-MA)/L1',
  compression: '((MB-MA)+2*MA*sin(kL/2)^2)*kL/(L1*sin(kL))',
  tension: '((MB-MA)-2*MA*sinh(kL/2)^2)*kL/(L1*sinh(kL))',
};
const POINT: Readonly<Record<Order, string>> = {
  first: 'Vp+W*(L1-a)/L1',
  compression: 'Vp+W*sin(kL*(L1-a)/L1)/sin(kL)',
  tension: 'Vp+W*sinh(kL*(L1-a)/L1)/sinh(kL)',
};
const UNIFORM_WHOLE: Readonly<Record<Order, string>> = {
  first: 'Vp+w*L1/2',
  compression: 'Vp+w*L1*tan(kL/2)/kL',
  tension: 'Vp+w*L1*tanh(kL/2)/kL',
};
const UNIFORM: Readonly<Record<Order, string>> = {
  first: 'Vp+w*(b-a)*(2*L1-a-b)/(2*L1)',
  compression: 'Vp+2*w*L1*sin(kL*(2*L1-a-b)/(2*L1))*sin(kL*(b-a)/(2*L1))/(kL*sin(kL))',
  tension: 'Vp+2*w*L1*sinh(kL*(2*L1-a-b)/(2*L1))*sinh(kL*(b-a)/(2*L1))/(kL*sinh(kL))',
};
// The load is wa, and (wb − wa) from nothing at a to the whole at b.
const LINEAR: Readonly<Record<Order, string>> = {
  first: 'Vp+(b-a)*(wa*(3*L1-2*a-b)+wb*(3*L1-a-2*b))/(6*L1)',
  compression:
    'Vp+2*wa*L1*sin(kL*(2*L1-a-b)/(2*L1))*sin(kL*(b-a)/(2*L1))/(kL*sin(kL))+(wb-wa)*(2*sin(kL*(L1-b)/L1)*(L1*sin(kL*(b-a)/(2*L1))/kL)^2+cos(kL*(L1-b)/L1)*kL*(b-a)^3*Phi3((kL*(b-a)/L1)^2)/L1)/((b-a)*sin(kL))',
  tension:
    'Vp+2*wa*L1*sinh(kL*(2*L1-a-b)/(2*L1))*sinh(kL*(b-a)/(2*L1))/(kL*sinh(kL))+(wb-wa)*(2*sinh(kL*(L1-b)/L1)*(L1*sinh(kL*(b-a)/(2*L1))/kL)^2+cosh(kL*(L1-b)/L1)*kL*(b-a)^3*Phi3(-(kL*(b-a)/L1)^2)/L1)/((b-a)*sinh(kL))',
};

const angle = (order: Order) => (order === 'first' ? {} : ({ kL: 'angle' } as const));
const common = { clause: '2', symbol: 'VA', dimension: 'force', prints: 'display' } as const;

/** Part of the end moments. */
export const endsShear = byOrder((order) =>
  formula({
    ...common,
    id: `VA-ends-${order}`,
    title: 'Shear at the start, from the end moments',
    expression: ENDS[order],
    operands: { MA: 'moment', MB: 'moment', L1: 'length', ...angle(order) },
  }),
);
/** A force at a, added. */
export const pointShear = byOrder((order) =>
  formula({
    ...common,
    id: `VA-point-${order}`,
    title: 'Shear at the start, with a force',
    expression: POINT[order],
    operands: { Vp: 'force', W: 'force', a: 'length', L1: 'length', ...angle(order) },
  }),
);
/** A uniform load over the whole bay, added. */
export const wholeShear = byOrder((order) =>
  formula({
    ...common,
    id: `VA-whole-${order}`,
    title: 'Shear at the start, with the uniform load',
    expression: UNIFORM_WHOLE[order],
    operands: { Vp: 'force', w: 'lineLoad', L1: 'length', ...angle(order) },
  }),
);
/** A uniform load from a to b, added. */
export const uniformShear = byOrder((order) =>
  formula({
    ...common,
    id: `VA-uniform-${order}`,
    title: 'Shear at the start, with a uniform load over a part',
    expression: UNIFORM[order],
    operands: {
      Vp: 'force',
      w: 'lineLoad',
      a: 'length',
      b: 'length',
      L1: 'length',
      ...angle(order),
    },
  }),
);
/** A load that varies in a straight line from a to b, added. */
export const linearShear = byOrder((order) =>
  formula({
    ...common,
    id: `VA-linear-${order}`,
    title: 'Shear at the start, with a varying load',
    expression: LINEAR[order],
    operands: {
      Vp: 'force',
      wa: 'lineLoad',
      wb: 'lineLoad',
      a: 'length',
      b: 'length',
      L1: 'length',
      ...angle(order),
    },
  }),
);

export const endShearFormulas = [
  endsShear,
  pointShear,
  wholeShear,
  uniformShear,
  linearShear,
].flatMap((family) => Object.values(family));
