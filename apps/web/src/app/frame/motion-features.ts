/** What framer-motion needs for our movements, fetched after the page is there. */
export { domAnimation } from 'framer-motion';
