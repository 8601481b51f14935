// How blocks look to readers: on pages, in feeds and in mail. Light: no schemas, no arithmetic, no editor.
export { FeedEntry } from './feed-view.tsx';
export { pictureData, readerRuns } from './reader.tsx';
export { buildFact, dayFacts, oneFacts, tallyFigure, tallySaid } from './tally-words.ts';
