export default () => undefined;
