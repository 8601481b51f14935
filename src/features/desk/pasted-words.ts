import DOMPurify from 'dompurify';
import { tidiedMarkup } from './pasted-markup.ts';

const tags = ['p', 'br', 'h2', 'h3', 'strong', 'em', 's', 'code', 'a', 'ul', 'ol', 'li', 'blockquote', 'table', 'thead', 'tbody', 'tr', 'th', 'td', 'section'];
// The last five are written by our own clipboard: where a cut began, and blocks whole. What they hold is checked again when it is read.
const attributes = ['href', 'colspan', 'rowspan', 'start', 'data-pm-slice', 'data-id', 'data-block', 'data-block-version', 'data-block-data'];

/** Pasted HTML cut down to our own prose: no scripts, styles, classes, pictures or addresses other than https, http and mailto. */
export function pastedWords(html: string): string {
  return DOMPurify.sanitize(tidiedMarkup(html), {
    ALLOWED_TAGS: tags,
    ALLOWED_ATTR: attributes,
    ALLOW_DATA_ATTR: false,
    ALLOW_ARIA_ATTR: false,
    ALLOWED_URI_REGEXP: /^(?:https?:\/\/|mailto:)\S+$/i,
    ADD_URI_SAFE_ATTR: attributes.filter((name) => name !== 'href'),
  });
}
