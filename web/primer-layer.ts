import type { AtRule, Root } from 'postcss';

/** Puts the component CSS of @primer/react into a cascade layer, so that our shapes win in whatever order lazy routes load it. */
export const primerLayer = {
  postcssPlugin: 'primer-layer',
  Once(root: Root, { AtRule }: { AtRule: new (props: { name: string; params: string }) => AtRule }) {
    if (!root.source?.input.file?.includes('/@primer/react/')) return;
    const layer = new AtRule({ name: 'layer', params: 'primer' });
    layer.append(root.nodes);
    root.append(layer);
  },
};
