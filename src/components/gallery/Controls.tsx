import { Copy, Download, Plus, Printer, Trash2 } from 'lucide-react';
import { useState } from 'react';
import { AnswerBar } from '../ui/AnswerBar';
import { Button, ButtonLink } from '../ui/Button';
import { Checkbox } from '../ui/Checkbox';
import { Disclosure } from '../ui/Disclosure';
import { Fact } from '../ui/Fact';
import { Field, TextArea } from '../ui/Field';
import { NumberField } from '../ui/NumberField';
import { SegmentedControl } from '../ui/SegmentedControl';
import { Select } from '../ui/Select';
import { Tabs } from '../ui/Tabs';
import { Section } from './Section';

const confidences = ['50 %', '80 %', '90 %', '95 %', '99 %'].map((word) => ({ value: word, word }));

export function Controls() {
  const [confidence, setConfidence] = useState('95 %');
  const [view, setView] = useState<'colours' | 'parts'>('colours');
  return (
    <div className="space-y-12">
      <Section title="The answer">
        <div className="flex flex-wrap items-end justify-between gap-6">
          <Fact lead="Buy or set aside" answer="18 skeins" live>
            in five colours, <b className="text-ink">{confidence} sure</b> to finish. 2,741 m
            expected, 3,600 m in hand.
          </Fact>
          <SegmentedControl
            label="How sure"
            figures
            options={confidences}
            value={confidence}
            onChange={setConfidence}
          />
        </div>
      </Section>

      <Section title="Buttons">
        <div className="flex flex-wrap gap-3">
          <ButtonLink href="#" kind="primary" icon={Printer}>
            Shopping list
          </ButtonLink>
          <Button icon={Plus}>Add a colour</Button>
          <Button kind="destructive" icon={Trash2}>
            Remove this lot
          </Button>
          <Button kind="quiet" icon={Copy}>
            Copy
          </Button>
          <Button small icon={Download}>
            Export CSV
          </Button>
        </div>
        <div className="mt-3 flex flex-wrap gap-3">
          <Button kind="primary" busy="Saving…">
            Save
          </Button>
          <Button kind="primary" disabled>
            Save
          </Button>
          <Button disabled>Add a colour</Button>
          <Button kind="destructive" disabled>
            Remove
          </Button>
        </div>
      </Section>

      <Section title="Fields">
        <div className="grid max-w-4xl gap-x-4 gap-y-5 sm:grid-cols-2 lg:grid-cols-3">
          <Numbers />
          <Select label="Weight" options={[{ value: '4', word: '4 Medium' }]} />
          <Field label="Name" hint="As on the band of the yarn." defaultValue="Harbour" />
          <Field
            label="E-mail"
            type="email"
            defaultValue="marit@"
            error="Write an address with a part after the @, such as marit@example.org"
          />
          <Select
            label="Join"
            error="Braid loops need 15 or 19 stitches a side; this motif has 16"
            options={[{ value: 'braid', word: 'Braid loops' }]}
          />
          <Field label="Dye lot" defaultValue="K418" disabled />
          <Select
            label="Pattern"
            disabled
            options={[{ value: 'g', word: 'Four-round group square' }]}
          />
          <TextArea label="Rnd 1" mono defaultValue="Ch 3 (counts as dc), 2 dc in ring, ch 2" />
          <div>
            <Checkbox label="One dye lot only" defaultChecked />
            <Checkbox label="Keep this motif where it is" hint="Colours are placed around it." />
            <Checkbox label="All rounds" mixed />
          </div>
        </div>
      </Section>

      <Section title="Tabs and disclosure">
        <Tabs
          label="Where the yarn goes"
          value={view}
          onChange={setView}
          tabs={[
            {
              key: 'colours',
              word: 'Colours',
              content: <p>Harbour goes into the joins and the border.</p>,
            },
            {
              key: 'parts',
              word: 'Parts',
              content: <p>Motif rounds take 1,557 m, joins 742 m.</p>,
            },
          ]}
        />
        <Disclosure className="mt-4" summary="How this is worked out">
          <p>
            480 dc of 4 loops, 5.2 mm a loop: <span className="figures">9.98 m</span> in each motif.
          </p>
        </Disclosure>
      </Section>
      <AnswerBar
        answer="18 skeins"
        detail={`${confidence} sure · 118 × 147 cm`}
        action={
          <Button kind="primary" icon={Printer}>
            List
          </Button>
        }
      />
    </div>
  );
}

function Numbers() {
  const [grams, setGrams] = useState<number | null>(100);
  return (
    <>
      <NumberField
        label="Skein"
        unit="g"
        min={1}
        max={10_000}
        value={grams}
        onCommit={(reading) => reading.ok && setGrams(reading.value)}
        hint={`Kept: ${grams ?? 'nothing'}`}
      />
      <NumberField
        label="Rows"
        whole
        value={18}
        onCommit={() => {}}
        error="18 rows in 12.4 cm is outside what medium yarn could give. Check the height."
      />
      <NumberField
        label="Measured side"
        unit="cm"
        optional
        value={null}
        onCommit={() => {}}
        hint="Empty: worked out from the swatch."
      />
    </>
  );
}
