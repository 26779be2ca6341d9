/** The tabs of the sheet beside its readings, fetched together. */
export { BoxList } from './box-list.js';
export { DerivedPanel } from './derived-panel.js';
export { DescribedPanel } from './described-panel.js';
export { FactsPanel } from './facts-panel.js';
export { FindingsPanel } from './findings-panel.js';
