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

/** The figures of a sheet for one combination: member, moments of both planes, interaction, section. */
export function memberFigures(
  record: CalculationRecord,
  member: MemberRecord,
  combination: CombinationRecord | null,
): Block[] {
  const drawing = readMember(member, combination, record.units);
  const section = readSection(member, record.units);
  const under = combination ? `, combination ${combination.name}` : '';
  const figures: (readonly [Scene | null, string])[] = [
    [
      drawing && memberScene(drawing),
      `Member to scale${under}. Lengths are measured off from end A.`,
    ],
    ...(drawing?.planes ?? []).map(
      (plane) =>
        [
          momentDiagram(drawing as NonNullable<typeof drawing>, plane),
          `Moments about ${plane.plane === 'major' ? 'x' : 'y'}${under}, drawn on the compressed side.`,
        ] as const,
    ),
    crossSection(interactionDiagram(readInteraction(member)), section && sectionOutline(section)),
  ];
  return figures.flatMap(([scene, caption]): Block[] =>
    scene ? [{ kind: 'figure', scene, caption }] : [],
  );
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
