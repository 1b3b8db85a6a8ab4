// mathjs exports these factories, and documents them, but leaves them out of its types.
import 'mathjs';
declare module 'mathjs' {
  const createDenseMatrixClass: FactoryFunctionMap;
  const createFibonacciHeapClass: FactoryFunctionMap;
  const createLsolve: FactoryFunctionMap;
  const createLup: FactoryFunctionMap;
  const createMatrix: FactoryFunctionMap;
  const createMatrixClass: FactoryFunctionMap;
  const createSpaClass: FactoryFunctionMap;
  const createSparseMatrixClass: FactoryFunctionMap;
  const createUsolve: FactoryFunctionMap;
  const subtractScalarDependencies: FactoryFunctionMap;
}
