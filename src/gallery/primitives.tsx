import { type ReactNode, useState } from 'react';
import { useAnnounce } from '#client/ui/announcements.tsx';
import { Button } from '#client/ui/button.tsx';
import { Choice } from '#client/ui/choice.tsx';
import { Dialog } from '#client/ui/dialog.tsx';
import { Hint } from '#client/ui/hint.tsx';
import { Keycap } from '#client/ui/keycap.tsx';
import { Note } from '#client/ui/note.tsx';
import { RatioBar } from '#client/ui/ratio-bar.tsx';
import { SourceRing, SourceRingButton } from '#client/ui/source-ring.tsx';
import { Empty, Failure, Waiting } from '#client/ui/state-panels.tsx';
import { Tag } from '#client/ui/tag.tsx';
import { SelectField, TextArea, TextField } from '#client/ui/text-field.tsx';
import { VerdictText } from '#client/ui/verdict.tsx';

const Shown = ({ name, children }: { name: string; children: ReactNode }) => (
  <div className="grid grid-cols-[120px_minmax(0,1fr)] items-start gap-6 border-b border-zinc-2 py-4">
    <h3 className="caps">{name}</h3>
    <div className="flex flex-wrap items-center gap-3">{children}</div>
  </div>
);

/** Every primitive of the interface, in each of its states. */
export function Primitives() {
  const announce = useAnnounce();
  const [asking, setAsking] = useState(false);
  const [unit, setUnit] = useState<'us' | 'si'>('us');
  return (
    <>
      <Shown name="Buttons">
        <Button rank="main">Main</Button>
        <Button>Plain</Button>
        <Button rank="quiet">Quiet</Button>
        <Button rank="grave">Grave</Button>
        <Button disabled>Not now</Button>
        <Button size="small">Small</Button>
      </Shown>
      <Shown name="Fields">
        <TextField label="Text" hint="A hint below it." defaultValue="22 ft" />
        <TextField
          label="Refused"
          problem="Is a force; a length is wanted."
          defaultValue="22 kip"
        />
        <TextField label="To read" readOnly value="ANSI/AISC 360-22" />
        <SelectField
          label="Choice"
          value={unit}
          onValue={setUnit}
          options={[
            { value: 'us', text: 'US customary' },
            { value: 'si', text: 'SI' },
          ]}
        />
        <TextArea label="Long text" optional rows={2} />
        <Choice type="checkbox" defaultChecked>
          Confirmed
        </Choice>
        <Choice type="radio">from a drawing</Choice>
      </Shown>
      <Shown name="Sources">
        {(['T', 'F', 'D', 'A'] as const).map((letter) => (
          <SourceRing key={letter} letter={letter} confirmed={letter !== 'A'} />
        ))}
        <SourceRing letter="D" confirmed={false} />
        <Hint text="drawing S-201 rev C, confirmed">
          <SourceRingButton letter="D" confirmed aria-label="Source: drawing S-201 rev C" />
        </Hint>
      </Shown>
      <Shown name="Verdicts">
        <VerdictText verdict="OK" ratioText="0.929" />
        <VerdictText verdict="NOT OK" ratioText="1.041" />
        <VerdictText verdict="NOT CHECKED" ratioText={null} />
        <VerdictText verdict="FAILED" ratioText={null} />
      </Shown>
      <Shown name="Ratios">
        {[0.3, 0.929, 1.041].map((ratio) => (
          <div key={ratio} className="w-40">
            <RatioBar ratio={ratio} />
          </div>
        ))}
      </Shown>
      <Shown name="Tags, keys">
        <Tag>in check</Tag>
        <Tag tone="asks">over limit</Tag>
        <Keycap>Enter</Keycap>
        <Keycap>↑</Keycap>
      </Shown>
      <Shown name="Notes">
        <Note>A plain aside in a margin.</Note>
        <Note tone="asks">One that asks for something.</Note>
      </Shown>
      <Shown name="States">
        <Failure title="Something failed" onRetry={() => announce('Tried again.')}>
          In plain words, with a way on.
        </Failure>
        <Waiting what="the page" />
        <Empty action={<Button>Begin</Button>}>Nothing here yet.</Empty>
      </Shown>
      <Shown name="Overlays">
        <Button onClick={() => setAsking(true)}>Dialog</Button>
        <Button
          onClick={() =>
            announce({ text: 'C-07 deleted.', action: { label: 'Restore', run: () => {} } })
          }
        >
          Announcement
        </Button>
        {asking && (
          <Dialog
            title="A question"
            onClose={() => setAsking(false)}
            footer={<Button onClick={() => setAsking(false)}>Close</Button>}
          >
            <p>It has to be answered before going on.</p>
          </Dialog>
        )}
      </Shown>
    </>
  );
}
