import { SceneView } from '#client/document/figure-block.tsx';
import { fieldClass } from '#client/ui/field.tsx';
import { type DraftSizes, sizedShapes } from '#shared/contracts/draft-parts.ts';
import { hasWall, sizesOf } from '#shared/contracts/draft-section.ts';
import { sectionOutline } from '#shared/figures/section-outline.ts';
import { withoutPart } from '../edit-parts.ts';
import { sizedShapeWords, sizeWords, wallWords } from '../part-words.ts';
import { sizesDrawing } from '../sizes-drawing.ts';
import { InputRow } from './input-row.tsx';
import { useMemberForm } from './member-form-context.ts';
import { QuantityRow } from './quantity-row.tsx';
import { SourceControl } from './source-control.tsx';

const tables = 'tables';

/** A section by its sizes; one ring stands for all of them. */
export function SizesFields(props: { sizes: DraftSizes; units: 'us' | 'si' }) {
  const { sizes } = props;
  const { draft, edit, editable, problemAt } = useMemberForm();
  const change = (next: Partial<DraftSizes>, field: string) =>
    edit({ ...draft, sizes: { ...sizes, ...next } }, `sizes/${field}`);
  const problem = problemAt('section');
  const fits = sizesOf(sizes).every((name) => problemAt(`section.${name}`) === undefined);
  const drawing = fits ? sizesDrawing(sizes) : null;
  return (
    <>
      <InputRow
        path="section"
        label="Section"
        problem={problem}
        source={
          <SourceControl
            what="the sizes"
            stated={sizes}
            onChange={(stated) => change(stated, 'source')}
          />
        }
      >
        {(control) => (
          <select
            {...control}
            value={sizes.shape}
            disabled={!editable}
            onChange={({ target }) =>
              target.value === tables
                ? edit(withoutPart(draft, 'sizes'), 'sizes/remove')
                : change({ shape: target.value as DraftSizes['shape'], confirmed: false }, 'shape')
            }
            className={fieldClass(problem !== undefined)}
          >
            {sizedShapes.map((shape) => (
              <option key={shape} value={shape}>
                {sizedShapeWords[shape]}
              </option>
            ))}
            <option value={tables}>from the tables</option>
          </select>
        )}
      </InputRow>
      {sizesOf(sizes).map((name) => (
        <QuantityRow
          key={name}
          path={`section.${name}`}
          words={sizeWords[name]}
          quantity={{ text: sizes[name], source: sizes.source, confirmed: sizes.confirmed }}
          placeholder={name === 'Ro' ? '2 t' : props.units === 'us' ? 'in' : 'mm'}
          withSource={false}
          onChange={({ text, confirmed }) => change({ [name]: text, confirmed }, name)}
        />
      ))}
      {hasWall(sizes) && <WallRow sizes={sizes} onChange={change} />}
      {drawing && (
        <div className="mx-auto my-2 w-52">
          <SceneView scene={sectionOutline(drawing)} />
        </div>
      )}
    </>
  );
}

function WallRow(props: {
  sizes: DraftSizes;
  onChange: (next: Partial<DraftSizes>, field: string) => void;
}) {
  const { editable, problemAt } = useMemberForm();
  const problem = problemAt('section.wall');
  return (
    <InputRow path="section.wall" label="The wall is" problem={problem}>
      {(control) => (
        <select
          {...control}
          value={props.sizes.wall}
          disabled={!editable}
          title="Of a nominal wall B4.2 takes 0.93, of A1085 all"
          onChange={({ target }) =>
            props.onChange({ wall: target.value as DraftSizes['wall'], confirmed: false }, 'wall')
          }
          className={fieldClass(problem !== undefined)}
        >
          {Object.entries(wallWords).map(([value, text]) => (
            <option key={value} value={value}>
              {text}
            </option>
          ))}
        </select>
      )}
    </InputRow>
  );
}
