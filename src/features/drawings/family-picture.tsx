import type { Template } from '../../../shared/template/template';
import { DrawnPicture } from '../../components/drawn-picture';
import { useTemplatePicture } from '../../engine/use-template-picture';

/** The worked example of a family, drawn by the engine. */
export function FamilyPicture({ template }: { template: Template }) {
  const svg = useTemplatePicture(template.id);
  return (
    <DrawnPicture
      svg={svg}
      label={`Worked example of a ${template.name.toLowerCase()}`}
      className="family-picture"
    />
  );
}
