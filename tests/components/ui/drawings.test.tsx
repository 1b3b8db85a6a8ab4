// @vitest-environment jsdom
import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { ChanceTape } from '../../../src/components/ui/ChanceTape';
import { StrandBar } from '../../../src/components/ui/StrandBar';
import { WoundCard } from '../../../src/components/ui/WoundCard';
import { stubWidth } from '../resizeObserver';

beforeEach(() => stubWidth(320));
afterEach(cleanup);

describe('WoundCard', () => {
  it('is named by its words, and its drawing is then silent', () => {
    const { container } = render(
      <WoundCard colour="#2d5872" weight={4} name="Harbour" lot="K418" amount="1,184 m" />,
    );
    expect(container.textContent).toBe('Harbourlot K4181,184 m');
    expect(container.querySelector('svg')?.getAttribute('aria-hidden')).toBe('true');
  });

  it('says its label where no words stand beneath it', () => {
    render(<WoundCard colour="#2d5872" weight={4} label="Harbour" />);
    expect(screen.getByRole('img', { name: 'Harbour' })).toBeDefined();
  });

  it('is the same drawing every time', () => {
    const card = <WoundCard colour="#fdfdfb" weight={1} size="lg" />;
    const first = render(card).container.innerHTML;
    cleanup();
    expect(render(card).container.innerHTML).toBe(first);
  });
});

describe('StrandBar', () => {
  const widths = () =>
    [...screen.getByRole('img').querySelectorAll(':scope > rect')].map((rect) =>
      rect.getAttribute('width'),
    );

  it('is as long as its fraction of the track, with the uncertain part after it', () => {
    render(
      <StrandBar colour="#b8432f" weight={4} fraction={0.5} sureFraction={0.6} label="Rowan" />,
    );
    expect(widths()).toEqual(['100%', '10.00%', '50.00%']);
  });

  it('never leaves its track, and draws no bar of nothing', () => {
    render(<StrandBar colour="#b8432f" weight={4} fraction={1.4} label="Rowan" />);
    expect(widths()).toEqual(['100%', '100.00%']);
    cleanup();
    render(<StrandBar colour="#b8432f" weight={4} fraction={0} label="Rowan" />);
    expect(widths()).toEqual(['100%']);
  });

  it('gives each bar its own patterns', () => {
    const { container } = render(
      <>
        <StrandBar colour="#b8432f" weight={4} fraction={0.5} label="Rowan" />
        <StrandBar colour="#2d5872" weight={4} fraction={0.5} label="Harbour" />
      </>,
    );
    const ids = [...container.querySelectorAll('pattern')].map(({ id }) => id);
    expect(new Set(ids).size).toBe(4);
  });
});

describe('ChanceTape', () => {
  it('puts the mark on the skeins one owns and says the chance in words', () => {
    render(
      <ChanceTape
        meanM={1184}
        sdM={53}
        skeinM={200}
        skeins={7}
        chances={[
          { skeins: 6, probabilityShort: 0.38 },
          { skeins: 7, probabilityShort: 0.00002 },
        ]}
        colour="#2d5872"
        weight={4}
      />,
    );
    const tape = screen.getByRole('img', { name: /^Seven skeins leave less than 0\.1/ });
    const flag = [...tape.querySelectorAll('text')].find(
      ({ textContent }) => textContent === 'own 7',
    );
    const tick = [...tape.querySelectorAll('text')].find(({ textContent }) => textContent === '7');
    const flagX = Number(flag?.getAttribute('x'));
    expect(Math.abs(flagX - Number(tick?.getAttribute('x')))).toBe(6);
  });
});
