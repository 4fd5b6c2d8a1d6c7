namespace HemoRheo.Notebooks.Tests;

/// <summary>Classes of this collection run one after the other: a kernel takes a port and half a gigabyte.</summary>
[CollectionDefinition(Name)]
public sealed class OneKernelAtATime
{
    public const string Name = "one kernel at a time";
}
