import type { CalculationRecord, CombinationRecord, MemberRecord } from '../calc/record.ts';
import { interactionDiagram } from '../figures/interaction-diagram.ts';
import { memberScene } from '../figures/member-scene.ts';
import { momentDiagram } from '../figures/moment-diagram.ts';
import { readInteraction } from '../figures/read-interaction.ts';
import { readMember } from '../figures/read-member.ts';
import { readSection } from '../figures/read-section.ts';
import type { Scene } from '../figures/scene.ts';
import { sectionOutline } from '../figures/section-outline.ts';
import { sideBySide } from '../figures/side-by-side.ts';
import type { Block } from './tree.ts';

/**
 * The member and, under it at the same scale, the moments of both planes for one combination; the
 * last one carries the words for all of them.
 */
export function memberFigures(
  record: CalculationRecord,
  member: MemberRecord,
  combination: CombinationRecord | null,
): Block[] {
  const drawing = readMember(member, combination, record.units);
  if (!drawing) return [];
  const moments = drawing.planes.flatMap((plane) => momentDiagram(drawing, plane) ?? []);
  const under = combination ? `, combination ${combination.name}` : '';
  const sides = moments.length > 0 ? ', moments on the compressed side' : '';
  const caption = `Member to scale${under}. Lengths from end A${sides}.`;
  const scenes = [memberScene(drawing), ...moments];
  return scenes.map((scene, index) => ({
    kind: 'figure',
    scene,
    caption: index === scenes.length - 1 ? caption : '',
  }));
}

/** Every combination in the interaction diagram, with the section's outline beside it. */
export function interactionFigure(record: CalculationRecord, member: MemberRecord): Block[] {
  const section = readSection(member, record.units);
  const [scene, caption] = crossSection(
    interactionDiagram(readInteraction(member)),
    section && sectionOutline(section),
  );
  return scene ? [{ kind: 'figure', scene, caption }] : [];
}

const OUTLINE = 'Section to scale, without fillets.';

/** The interaction diagram and the section's outline stand beside each other. */
function crossSection(
  interaction: Scene | null,
  outline: Scene | null,
): readonly [Scene | null, string] {
  if (!interaction) return [outline, OUTLINE];
  const caption = 'Interaction, every combination as a point.';
  return outline
    ? [sideBySide(interaction, outline), `${caption} ${OUTLINE}`]
    : [interaction, caption];
}
