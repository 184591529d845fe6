import { renderHook } from '@testing-library/react';
import { act } from 'react';
import { afterEach, describe, expect, it } from 'vitest';
import { chooseTheme, useThemeChoice } from './theme-choice';

const classes = () => [...document.documentElement.classList];

afterEach(() => {
  localStorage.clear();
  document.documentElement.className = '';
});

describe('the theme', () => {
  it('follows the system until somebody chooses', () => {
    expect(renderHook(() => useThemeChoice()).result.current).toBe('system');
  });

  it('changes at once and is kept for the next visit', () => {
    const { result } = renderHook(() => useThemeChoice());
    act(() => chooseTheme('dark'));
    expect(result.current).toBe('dark');
    expect(classes()).toEqual(['dark']);
    // The script that runs before the first paint reads this key.
    expect(localStorage.getItem('brimgate-theme')).toBe('dark');
  });

  it('never is light and dark at the same time', () => {
    act(() => chooseTheme('dark'));
    act(() => chooseTheme('light'));
    expect(classes()).toEqual(['light']);
  });

  it('takes anything unknown in storage for the system’s choice', () => {
    localStorage.setItem('brimgate-theme', 'sepia');
    expect(renderHook(() => useThemeChoice()).result.current).toBe('system');
  });
});
