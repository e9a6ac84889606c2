/** The password of everybody of the demo; nowhere else is there one that is written down. */
export const demoPassword = 'skerrow-demo';
