// Only what animates: no dragging, no layout projection. Loaded after the first paint.
export { domAnimation as default } from 'framer-motion';
