import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { useState } from 'react';
import { afterEach, describe, expect, it } from 'vitest';
import { SectionDrawing } from './section-drawing';
import type { DrawnLayer } from './section-geometry';

const LAYERS: DrawnLayer[] = [
  { name: 'PET film', materialClass: 'polyester', kind: 'film', thicknessUm: 12, gaugeLabel: '12 µm' },
  {
    name: 'Metallisation',
    materialClass: 'metal',
    kind: 'coating',
    thicknessUm: 0.03,
    gaugeLabel: '0.03 µm',
  },
  { name: 'LDPE film', materialClass: 'polyolefin', kind: 'film', thicknessUm: 60, gaugeLabel: '60 µm' },
];

function Drawing() {
  const [selected, setSelected] = useState<number | undefined>(undefined);
  return (
    <SectionDrawing
      name="Section of the wall"
      sentence="PET, metal, LDPE."
      layers={LAYERS}
      selectedIndex={selected}
      onSelect={setSelected}
    />
  );
}

afterEach(cleanup);

describe('SectionDrawing', () => {
  it('is heard as one image with its sentence, and its layers as a choice', () => {
    render(<Drawing />);
    expect(screen.getByRole('img', { name: 'Section of the wall. PET, metal, LDPE.' })).toBeTruthy();
    expect(screen.getAllByRole('radio').map((radio) => radio.getAttribute('aria-label'))).toEqual([
      '1: PET film, 12 µm',
      '2: Metallisation, 0.03 µm',
      '3: LDPE film, 60 µm',
    ]);
  });

  it('is walked through with the arrow keys, one stop for Tab, no wrap at the faces', () => {
    render(<Drawing />);
    const radios = screen.getAllByRole('radio');
    const chosen = () => radios.map((radio) => radio.getAttribute('aria-checked'));
    const tabStops = () => radios.filter((radio) => radio.tabIndex === 0).length;
    expect(tabStops()).toBe(1);
    fireEvent.keyDown(screen.getByRole('radiogroup'), { key: 'ArrowRight' });
    expect(chosen()).toEqual(['false', 'true', 'false']);
    fireEvent.keyDown(screen.getByRole('radiogroup'), { key: 'End' });
    fireEvent.keyDown(screen.getByRole('radiogroup'), { key: 'ArrowRight' });
    expect(chosen()).toEqual(['false', 'false', 'true']);
    expect(document.activeElement).toBe(radios[2]);
    expect(tabStops()).toBe(1);
  });

  it('says on the drawing which layers are not to scale, and gives every gauge with its unit', () => {
    const { container } = render(<Drawing />);
    expect(container.textContent).toContain('Layers to scale, thin ones widened to be seen.');
    for (const { gaugeLabel } of LAYERS) expect(container.textContent).toContain(gaugeLabel);
  });
});
