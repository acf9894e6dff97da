import type { GivenValue } from '../calc/quantity.ts';
import type { Section } from '../sections/section.ts';
import type { Shape } from '../sections/table.ts';
import { type ReadQuantity, TYPED } from './given-values.ts';
import type { MemberInput } from './input.ts';
import { findGrade, type Product, type ResolvedSteel, STEELS, steelFor } from './material.ts';

type Report = (path: string, message: string) => void;

/**
 * A steel by its grade, in the row for what the section is and how thick, or one of the user's own
 * with the source of its yield stress. Without a section (another shape, outside scope): as a shape.
 */
export function resolveSteel(
  m: MemberInput,
  problem: Report,
  quantity: ReadQuantity,
  section: Section | null,
): ResolvedSteel {
  if (typeof m.material === 'string') return gradeFor(m.material, section, problem);
  if (m.material.source === undefined)
    problem(
      'material.source',
      'is needed: a steel of your own states where its yield stress is from',
    );
  const Fy = quantity('material.Fy', m.material.Fy, 'stress');
  const Fu = quantity('material.Fu', m.material.Fu, 'stress');
  if (Fu && Fu.value <= 0) problem('material.Fu', `is ${Fu.text}; it must be above zero`);
  if (Fy && Fy.value <= 0) problem('material.Fy', `is ${Fy.text}; it must be above zero`);
  const stated = {
    source: m.material.source ?? TYPED,
    confirmed: m.material.confirmed ?? false,
  };
  return {
    kind: 'own',
    name: m.material.name,
    Fy: { ...(Fy ?? NO_STRESS), ...stated },
    Fu: Fu && { ...Fu, ...stated },
  };
}

const NO_STRESS: GivenValue = { value: 1, text: '1 MPa', source: TYPED, confirmed: false };

function gradeFor(name: string, section: Section | null, problem: Report): ResolvedSteel {
  const grade = findGrade(name);
  const none: ResolvedSteel = { kind: 'own', name, Fy: NO_STRESS, Fu: null };
  if (!grade) {
    problem(
      'material',
      `"${name}" is not a steel known here; choose ${STEELS.map(({ key }) => key).join(', ')}, or give your own with name, Fy and source`,
    );
    return none;
  }
  if (grade.key === 'A1085' && section?.by === 'table' && isTube(section.shape))
    problem(
      'material',
      `is A1085, but ${section.shape.designation} is in the table with the design wall thickness of A500 (0.93 of the nominal one); give the tube by its sizes with its nominal wall, or choose another steel`,
    );
  const [product, thickness] = section ? productOf(section) : (['shapes', 0] as const);
  const found = steelFor(grade, product, thickness);
  if (found) return { kind: 'grade', ...found };
  problem(
    'material',
    `is ${grade.title}, whose ${product} are not made as thick as this section; choose another, or give your own with name, Fy and source`,
  );
  return none;
}

const isTube = ({ kind }: Shape): boolean => kind === 'rect-hss' || kind === 'round';

/** What the steel of the section is made as, and its greatest thickness in mm. */
function productOf(section: Section): readonly [Product, number] {
  if (section.by === 'table') {
    const { shape } = section;
    switch (shape.kind) {
      case 'i':
      case 'channel':
        return ['shapes', shape.properties.tf.value];
      case 'rect-hss':
        return ['rectangular tubes', shape.properties.t.value];
      case 'round':
        return ['round tubes', shape.properties.t.value];
    }
  }
  const { sizes } = section;
  switch (sizes.shape) {
    case 'i':
    case 'box':
      return ['plates', Math.max(sizes.tf.value, sizes.tw.value)];
    case 'mono-i':
      return ['plates', Math.max(sizes.tfTop.value, sizes.tfBottom.value, sizes.tw.value)];
    case 'tube':
      return ['rectangular tubes', sizes.t.value];
    case 'round':
      return ['round tubes', sizes.t.value];
  }
}
