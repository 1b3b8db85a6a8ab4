// @vitest-environment jsdom
import { act, cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { useUnits } from '../../../src/components/ui/useUnits';

afterEach(cleanup);

function Shown() {
  return <output>{useUnits('metric')}</output>;
}
function announce(detail: string): boolean {
  const event = new CustomEvent('ellwise:units', { detail, cancelable: true });
  return document.dispatchEvent(event);
}

describe('useUnits', () => {
  it('follows the header, and tells it that no new page is needed', () => {
    render(<Shown />);
    let drawAnew = true;
    act(() => {
      drawAnew = announce('imperial');
    });
    expect(drawAnew).toBe(false);
    expect(screen.getByRole('status').textContent).toBe('imperial');
  });

  it('lets the page be drawn anew once the island is gone', () => {
    render(<Shown />).unmount();
    expect(announce('imperial')).toBe(true);
  });
});
