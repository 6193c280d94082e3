import { act, cleanup, fireEvent, render, screen } from '@testing-library/react';
import { useState } from 'react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { Button } from './button';
import { Choice } from './choice';
import { DataTable } from './data-table';
import { Disclosure } from './disclosure';
import { Link } from './link';
import { LoadingState } from './loading-state';
import { Menu } from './menu';
import { NavigationProvider } from './navigation';
import { PageTitleProvider } from './page-title';
import { Screen } from './screen';
import { Select } from './select';
import { Stepper } from './stepper';
import { ThemeProvider, useTheme } from './theme';

afterEach(() => {
  cleanup();
  vi.useRealTimers();
});

describe('Button', () => {
  it('acts, and does not while busy or disabled', () => {
    const onPress = vi.fn();
    const { rerender } = render(<Button label="Save" onPress={onPress} />);
    fireEvent.click(screen.getByRole('button', { name: 'Save' }));
    expect(onPress).toHaveBeenCalledTimes(1);
    rerender(<Button label="Save" busyLabel="Saving…" onPress={onPress} isBusy />);
    fireEvent.click(screen.getByRole('button', { name: 'Saving…' }));
    rerender(<Button label="Save" onPress={onPress} isDisabled />);
    const disabled = screen.getByRole('button', { name: 'Save' });
    fireEvent.click(disabled);
    expect(disabled.getAttribute('aria-disabled')).toBe('true');
    expect(onPress).toHaveBeenCalledTimes(1);
  });
});

describe('Link', () => {
  it('stays in the page for a plain click and leaves the others to the browser', () => {
    const go = vi.fn();
    render(
      <NavigationProvider navigation={{ go }}>
        <Link href="/a/x/studies">Studies</Link>
      </NavigationProvider>,
    );
    const link = screen.getByRole('link', { name: 'Studies' });
    expect(link.getAttribute('href')).toBe('/a/x/studies');
    // jsdom cannot open what the browser would.
    window.addEventListener('click', (event) => event.preventDefault(), { once: true });
    fireEvent.click(link, { ctrlKey: true });
    expect(go).not.toHaveBeenCalled();
    fireEvent.click(link);
    expect(go).toHaveBeenCalledWith('/a/x/studies');
  });
});

describe('Choice', () => {
  function Units() {
    const [value, setValue] = useState('metric');
    const options = [
      { value: 'metric', label: 'Metric' },
      { value: 'us_customary', label: 'US customary' },
    ];
    return <Choice label="Units" value={value} onChange={setValue} options={options} />;
  }

  it('is one tab stop and moves with the arrows', () => {
    render(<Units />);
    const metric = screen.getByRole('radio', { name: 'Metric' });
    const us = screen.getByRole('radio', { name: 'US customary' });
    expect(screen.getByRole('radiogroup', { name: 'Units' })).toBeTruthy();
    expect([metric.tabIndex, us.tabIndex]).toEqual([0, -1]);
    fireEvent.keyDown(metric, { key: 'ArrowRight' });
    expect(us.getAttribute('aria-checked')).toBe('true');
    expect(document.activeElement).toBe(us);
    expect([metric.tabIndex, us.tabIndex]).toEqual([-1, 0]);
  });
});

describe('Stepper', () => {
  function Gauge() {
    const [value, setValue] = useState('58');
    return (
      <Stepper
        label="Gauge of PE"
        value={value}
        onChange={setValue}
        unit="µm"
        step={{ by: 5, min: 5, max: 60 }}
      />
    );
  }

  it('steps by its buttons and the arrow keys, within its bounds', () => {
    render(<Gauge />);
    const box = screen.getByRole('textbox', { name: 'Gauge of PE, µm' });
    fireEvent.click(screen.getByRole('button', { name: 'Gauge of PE: more' }));
    expect(box).toHaveProperty('value', '60');
    fireEvent.keyDown(box, { key: 'ArrowDown' });
    expect(box).toHaveProperty('value', '55');
    fireEvent.change(box, { target: { value: '7,' } });
    expect(box).toHaveProperty('value', '7,');
  });
});

describe('Select', () => {
  it('names its control, its groups and its fault', () => {
    const onChange = vi.fn();
    render(
      <Select
        label="Material"
        value=""
        onChange={onChange}
        options={[
          { value: '', label: 'Choose a material' },
          { label: 'Polyesters', options: [{ value: 'pet', label: 'PET' }] },
        ]}
        error="Material: choose one."
      />,
    );
    const select = screen.getByRole('combobox', { name: 'Material' });
    const description = document.getElementById(select.getAttribute('aria-describedby') ?? '');
    expect(description?.textContent).toBe('Material: choose one.');
    expect(screen.getByRole('group', { name: 'Polyesters' })).toBeTruthy();
    fireEvent.change(select, { target: { value: 'pet' } });
    expect(onChange).toHaveBeenCalledWith('pet');
  });
});

describe('Menu', () => {
  it('opens at its first item, walks by arrows and gives the focus back', () => {
    const onRemove = vi.fn();
    render(
      <Menu
        label="More about EVOH"
        items={[
          { label: 'Duplicate', onPress: vi.fn() },
          { label: 'Remove', onPress: onRemove },
        ]}
      />,
    );
    const opener = screen.getByRole('button', { name: 'More about EVOH' });
    fireEvent.click(opener);
    expect(document.activeElement).toBe(screen.getByRole('menuitem', { name: 'Duplicate' }));
    fireEvent.keyDown(screen.getByRole('menu'), { key: 'ArrowUp' });
    expect(document.activeElement).toBe(screen.getByRole('menuitem', { name: 'Remove' }));
    fireEvent.keyDown(screen.getByRole('menu'), { key: 'Escape' });
    expect(screen.queryByRole('menu')).toBeNull();
    expect(document.activeElement).toBe(opener);
    fireEvent.click(opener);
    fireEvent.click(screen.getByRole('menuitem', { name: 'Remove' }));
    expect(onRemove).toHaveBeenCalledTimes(1);
  });
});

describe('Disclosure', () => {
  it('says whether it is open', () => {
    render(
      <Disclosure>
        <span>the table</span>
      </Disclosure>,
    );
    const button = screen.getByRole('button', { name: 'Table behind this chart' });
    expect(button.getAttribute('aria-expanded')).toBe('false');
    fireEvent.click(button);
    expect(button.getAttribute('aria-expanded')).toBe('true');
    expect(screen.getByText('the table')).toBeTruthy();
  });
});

describe('DataTable', () => {
  const columns = ['a', 'b', 'c', 'd'].map((key) => ({
    key,
    title: key.toUpperCase(),
    unit: key === 'b' ? 'µm' : undefined,
  }));

  it('stays a table to readers when its cells stack', () => {
    // jsdom has no media queries, so this is the narrow form.
    render(<DataTable caption="Layers" columns={columns} rows={[{ a: 'PET', b: '12', c: '1', d: '2' }]} />);
    expect(screen.getByRole('table', { name: 'Layers' })).toBeTruthy();
    expect(screen.getByRole('rowheader').textContent).toBe('PET');
    expect(screen.getAllByRole('cell').map((cell) => cell.textContent)).toEqual(['B, µm12', 'C1', 'D2']);
  });

  it('keeps few columns side by side in a region that can scroll', () => {
    render(<DataTable caption="Layers" columns={columns.slice(0, 2)} rows={[]} emptyText="None so far." />);
    expect(screen.getByRole('region', { name: 'Layers' }).tabIndex).toBe(0);
    expect(screen.getAllByRole('columnheader').map((cell) => cell.textContent)).toEqual(['A', 'Bµm']);
    expect(screen.getByText('None so far.')).toBeTruthy();
  });
});

describe('LoadingState', () => {
  it('is silent at first and after two seconds says that it takes longer', () => {
    vi.useFakeTimers();
    render(<LoadingState what="Fetching the study" />);
    expect(screen.queryByText(/Fetching/)).toBeNull();
    act(() => void vi.advanceTimersByTime(300));
    expect(screen.getByText('Fetching the study…')).toBeTruthy();
    act(() => void vi.advanceTimersByTime(2000));
    expect(screen.getByText(/takes longer than usual/)).toBeTruthy();
  });
});

describe('Screen', () => {
  it('names the page, once, and leads back', () => {
    render(
      <PageTitleProvider suffix="Larderline">
        <Screen title="Hazelnuts" back={{ href: '/a/x/studies', label: 'Studies' }}>
          <span>content</span>
        </Screen>
      </PageTitleProvider>,
    );
    expect(document.title).toBe('Hazelnuts · Larderline');
    expect(screen.getByRole('heading', { level: 1 }).textContent).toBe('Hazelnuts');
    expect(screen.getByRole('link', { name: 'Studies' }).getAttribute('href')).toBe('/a/x/studies');
  });
});

describe('ThemeProvider', () => {
  function Chooser() {
    const { scheme, setPreference } = useTheme();
    return <Button label={scheme} onPress={() => setPreference('dark')} />;
  }

  it('keeps the choice on the device', () => {
    window.localStorage.clear();
    render(
      <ThemeProvider>
        <Chooser />
      </ThemeProvider>,
    );
    fireEvent.click(screen.getByRole('button', { name: 'light' }));
    expect(screen.getByRole('button', { name: 'dark' })).toBeTruthy();
    cleanup();
    render(
      <ThemeProvider>
        <Chooser />
      </ThemeProvider>,
    );
    expect(screen.getByRole('button', { name: 'dark' })).toBeTruthy();
    window.localStorage.clear();
  });
});
