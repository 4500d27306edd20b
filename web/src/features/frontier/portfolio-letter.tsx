import { Diamond, Shield } from './chart-marks';
import styled from 'styled-components';

/** The mark of A or B beside text. */
export function PortfolioLetter({ letter, size = 16 }: { letter: 'A' | 'B'; size?: number }) {
  return (
    <Mark width={size} height={size} viewBox="-2 -2 28 28" role="img" aria-label={`Portfolio ${letter}`}>
      {letter === 'A' ? <Shield x={12} y={24} /> : <Diamond x={12} y={12} />}
    </Mark>
  );
}

const Mark = styled.svg`
  flex: none;
  vertical-align: -0.2em;
  text {
    font: 800 12.5px var(--mw-font);
  }
`;
