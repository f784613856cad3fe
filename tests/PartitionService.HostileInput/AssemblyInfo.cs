// The heap is measured over a whole process: other tests must not run beside.
[assembly: CollectionBehavior(DisableTestParallelization = true)]
