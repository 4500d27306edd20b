import styled from 'styled-components';
import { Notice } from '../../ui/notice';

/** What the site must offer. The tool lists it and clears nothing. */
export function PanelSiteNeeds({ needs }: { needs: readonly string[] }) {
  if (needs.length === 0) return null;
  return (
    <section>
      <h3>Site needs</h3>
      <List>
        {needs.map((need) => (
          <li key={need}>{need}</li>
        ))}
      </List>
      <Notice tone="caution" title="To be confirmed before an order">
        Listed needs come from the request and quotes. They are not checked by this tool. A qualified person
        must confirm them in writing before an order.
      </Notice>
    </section>
  );
}

const List = styled.ul`
  margin-bottom: 8px;
  padding-left: 18px;
  list-style: square;
  font-size: 13px;
`;
