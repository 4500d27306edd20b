import styled from 'styled-components';
import type { Answer } from './wording';

/** What portfolio A buys, as the title of the page and of the window. */
export function AnswerHeading({ answer: { cost, benefit, certainty } }: { answer: Answer }) {
  return (
    <Heading>
      <title>{`Frontier: ${cost} buys ${benefit} · Metewand`}</title>
      {cost} buys <em>{benefit}</em>. {certainty}
    </Heading>
  );
}

const Heading = styled.h1`
  font-size: var(--mw-t-20);
  line-height: 1.3;
  em {
    font-style: normal;
    box-shadow: inset 0 -0.42em 0 var(--mw-rod-soft);
  }
`;
