import type { CalculationRecord, CombinationRecord, MemberRecord } from '../calc/record.ts';
import { interactionDiagram } from '../figures/interaction-diagram.ts';
import { memberScene } from '../figures/member-scene.ts';
import { momentDiagram } from '../figures/moment-diagram.ts';
import { readInteraction } from '../figures/read-interaction.ts';
import { readMember } from '../figures/read-member.ts';
import { readSection } from '../figures/read-section.ts';
import type { Scene } from '../figures/scene.ts';
import { sectionOutline } from '../figures/section-outline.ts';
import { shearDiagram } from '../figures/shear-diagram.ts';
import { sideBySide } from '../figures/side-by-side.ts';
import type { Block } from './tree.ts';

/**
 * The member and, under it at the same scale, the moments and the shear of both planes for one
 * combination; the last one carries the words for all of them.
 */
export function memberFigures(
  record: CalculationRecord,
  member: MemberRecord,
  combination: CombinationRecord | null,
): Block[] {
  const drawing = readMember(member, combination, record.units);
  if (!drawing) return [];
  const moments = drawing.planes.map((plane) => momentDiagram(drawing, plane));
  const shears = drawing.planes.map((plane) => shearDiagram(drawing, plane));
  const under = combination ? `, combination ${combination.name}` : '';
  const words = [
    ...(drawing.chains.length > 0 ? [] : ['lengths from end A']),
    ...(moments.some((scene) => scene !== null) ? ['moments on the compressed side'] : []),
    ...(shears.some((scene) => scene !== null) ? ['shear as the slope of the moment'] : []),
  ].join(', ');
  const caption = `Member to scale${under}.${words && ` ${words[0]?.toUpperCase()}${words.slice(1)}.`}`;
  const diagrams = moments.flatMap((moment, plane) => [moment, shears[plane] ?? null]);
  const scenes = [memberScene(drawing), ...diagrams.filter((scene) => scene !== null)];
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
