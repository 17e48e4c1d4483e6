import { render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { buildFlaskCode } from '#shared/lib/codes.ts';
import { FlaskCodePicture, modules, quietModules } from './flask-code-picture.tsx';

describe('FlaskCodePicture', () => {
  it.each([1, 147, 9999, 999_999])(
    'draws flask %i in the 21 modules its sizes are reckoned from',
    (number) => {
      const code = buildFlaskCode(number);
      render(<FlaskCodePicture code={code} className="w-[29mm]" />);
      const picture = screen.getByRole('img', { name: `QR code of ${code}` });
      expect(picture).toHaveAttribute('viewBox', `0 0 ${modules} ${modules}`);
    },
  );

  it('leaves four modules of white on every side', () => {
    render(<FlaskCodePicture code="F-0147-2" className="w-[29mm]" />);
    const { left, top, width } = screen.getByRole('img').style;
    const share = (text: string): number => parseFloat(text) / 100;
    expect(share(left)).toBeCloseTo(share(top), 6);
    expect((share(left) / share(width)) * modules).toBeCloseTo(quietModules, 6);
  });
});
