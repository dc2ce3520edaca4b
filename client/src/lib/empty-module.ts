/** Stands in for style sheets and drawings when components are tested. */
export default '';
