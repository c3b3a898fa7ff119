export { domAnimation as default } from 'framer-motion';
