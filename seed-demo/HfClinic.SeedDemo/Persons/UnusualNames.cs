using System.Collections.Immutable;
using HfClinic.Clinical.Values;

namespace HfClinic.SeedDemo.Persons;

/// <summary>Names that a screen must bear: long, accented, with marks, from right to left.</summary>
internal static class UnusualNames
{
    public static readonly ImmutableArray<(string Family, string Given, Sex Sex)> All =
    [
        ("von Niedermarschenhausen-Oberdeichgrafensiel zu Salzwiesenbruch auf Hohensandban", "Maximiliane Philippa Leopoldine Theresia", Sex.Female),
        ("O'Strand", "Síle", Sex.Female),
        ("Žluťoučká", "Božena", Sex.Female),
        ("Åkerström-Ødegård", "Jürgen", Sex.Male),
        ("Nguyễn-Đầm", "Thị Ánh", Sex.Female),
        ("אגמון", "נועה", Sex.Female),
        ("السبخي", "سالم", Sex.Male),
        ("Łąka", "Świętosław", Sex.Male),
        ("D'Ávila-Peña", "María José", Sex.Female),
        ("Ó", "Ng", Sex.NotRecorded),
    ];
}
