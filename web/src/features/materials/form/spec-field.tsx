import { displayUnit } from '@embertally/shared/units/display-unit';
import { SelectField } from '../../../components/select-field.tsx';
import { TextAreaField } from '../../../components/text-area-field.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { useUnits } from '../../../lib/units-context.ts';
import type { FieldSpec } from './field-spec.ts';
import { MarksField } from './marks-field.tsx';
import { MaterialField } from './material-field.tsx';
import type { MaterialForm } from './use-material-form.ts';
import { valueOf } from './fields-of.ts';

interface SpecFieldProps {
  readonly material: MaterialForm;
  readonly spec: FieldSpec;
  /** Its place in the draft. */
  readonly name: string;
}

const YES_NO = [
  { value: '', label: 'Not said' },
  { value: 'yes', label: 'Yes' },
  { value: 'no', label: 'No' },
] as const;

/** One field of the form, as its description says. */
export function SpecField({ material, spec, name }: SpecFieldProps) {
  const units = useUnits();
  const ties = { ...material.form.field(name), value: valueOf(material.form.values, name, spec) };
  const texts = { label: spec.label, hint: spec.hint, optional: spec.optional };
  switch (spec.as) {
    case 'text':
      return spec.lines === 'several' ? (
        <TextAreaField {...texts} {...ties} rows={2} />
      ) : (
        <TextField {...texts} {...ties} width={spec.width ?? 'full'} autoComplete="off" />
      );
    case 'number': {
      const symbol = (spec.own === true ? displayUnit(spec.unit, units)?.symbol : undefined) ?? spec.unit;
      const unit = symbol.replace('kg/m3', 'kg/m³');
      return (
        <TextField
          {...texts}
          {...ties}
          label={unit === '' ? spec.label : `${spec.label} (${unit})`}
          unit={unit === '' ? undefined : unit}
          width="short"
          autoComplete="off"
          inputMode="text"
        />
      );
    }
    case 'choice':
      // "Optional" would be said twice: such a list begins with an answer that says nothing.
      return <SelectField {...texts} {...ties} optional={false} options={spec.options} width="medium" />;
    case 'yes-no':
      return <SelectField {...texts} {...ties} optional={false} options={YES_NO} width="short" />;
    case 'words':
      return <TextField {...texts} {...ties} autoComplete="off" />;
    case 'marks':
      return <MarksField legend={spec.label} options={spec.options} value={ties.value} onChange={ties.onChange} />;
    case 'material':
      return <MaterialField material={material} spec={spec} name={name} />;
  }
}
