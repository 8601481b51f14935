import { createElement, Fragment, type ReactNode } from 'react';
import type { ProseNode } from './prose.ts';

// Stored prose to elements. Every node and mark is named here, so nothing a writer stores can become anything else.

interface AnyNode {
  type: string;
  text?: string | undefined;
  attrs?: { href?: string; level?: number; start?: number | undefined; colspan?: number | undefined; rowspan?: number | undefined } | undefined;
  marks?: readonly { type: string; attrs?: { href: string } }[] | undefined;
  content?: readonly unknown[] | undefined;
}

const markTags: Readonly<Record<string, string>> = { bold: 'strong', italic: 'em', strike: 's', code: 'code' };
const blockTags: Readonly<Record<string, string>> = {
  paragraph: 'p', bulletList: 'ul', listItem: 'li', blockquote: 'blockquote', tableRow: 'tr',
};

function marked(node: AnyNode): ReactNode {
  return (node.marks ?? []).reduce<ReactNode>((inner, mark) => {
    const tag = markTags[mark.type];
    if (tag) return createElement(tag, null, inner);
    const href = mark.attrs?.href ?? '';
    return /^(https?:|mailto:)/i.test(href) ? <a href={href} rel="nofollow ugc noopener">{inner}</a> : inner;
  }, node.text);
}

function children(node: AnyNode): ReactNode {
  return (node.content ?? []).map((child, index) => <Fragment key={index}>{drawn(child as AnyNode)}</Fragment>);
}

function drawn(node: AnyNode): ReactNode {
  if (node.type === 'text') return marked(node);
  if (node.type === 'hardBreak') return <br />;
  const tag = blockTags[node.type];
  if (tag) return createElement(tag, null, children(node));
  if (node.type === 'heading') return createElement(`h${node.attrs?.level === 3 ? 3 : 2}`, null, children(node));
  if (node.type === 'orderedList') return <ol start={node.attrs?.start ?? 1}>{children(node)}</ol>;
  if (node.type === 'table') return <div className="prose-table"><table><tbody>{children(node)}</tbody></table></div>;
  if (node.type === 'tableCell' || node.type === 'tableHeader') {
    const { colspan = 1, rowspan = 1 } = node.attrs ?? {};
    return createElement(node.type === 'tableHeader' ? 'th' : 'td', { ...(colspan > 1 ? { colSpan: colspan } : {}), ...(rowspan > 1 ? { rowSpan: rowspan } : {}) }, children(node));
  }
  return children(node);
}

/** One piece of prose as elements. */
export function ProseView({ node }: { node: ProseNode }) {
  return <>{drawn(node as AnyNode)}</>;
}
