export default function buildBaseDatabase() {}
