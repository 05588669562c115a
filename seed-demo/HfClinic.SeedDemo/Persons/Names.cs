using System.Collections.Immutable;
using HfClinic.Clinical.Values;

namespace HfClinic.SeedDemo.Persons;

/// <summary>Names for invented people.</summary>
internal static class Names
{
    public static readonly ImmutableArray<string> Family =
    [
        "Alder", "Ashby", "Barrow", "Beck", "Birch", "Bramble", "Bridge", "Brook", "Burrow", "Calder", "Carr", "Cliff",
        "Combe", "Copse", "Cove", "Crane", "Croft", "Curlew", "Dale", "Dell", "Dene", "Drake", "Eddy", "Elder", "Fell",
        "Fern", "Finch", "Ford", "Gale", "Garth", "Glen", "Gorse", "Grove", "Hale", "Haven", "Hawthorn", "Hazel", "Heath",
        "Hedge", "Heron", "Hill", "Holm", "Hurst", "Ings", "Kestrel", "Knoll", "Lark", "Lea", "Linden", "Loch", "Mallow",
        "Marsh", "Mead", "Mere", "Mill", "Moor", "Moss", "Ness", "Oakes", "Orchard", "Pike", "Plover", "Pool", "Quarry",
        "Reed", "Ridge", "Rowan", "Rush", "Sand", "Sedge", "Shaw", "Shore", "Skerry", "Slate", "Stile", "Stone", "Strand",
        "Tarn", "Teal", "Thorn", "Tern", "Vale", "Wade", "Warren", "Weir", "Wick", "Willow", "Wold", "Wood", "Yarrow",
    ];

    private static readonly ImmutableArray<string> Female =
    [
        "Ada", "Agnes", "Alma", "Beata", "Bridget", "Cara", "Clara", "Dora", "Edith", "Elsa", "Fiona", "Flora", "Greta",
        "Hanna", "Hilda", "Ida", "Irma", "Joan", "Julia", "Karin", "Lena", "Lydia", "Mabel", "Marta", "Nora", "Olive",
        "Paula", "Rosa", "Ruth", "Selma", "Thea", "Vera", "Wilma", "Zofia",
    ];

    private static readonly ImmutableArray<string> Male =
    [
        "Abel", "Albin", "Anton", "Bernard", "Bruno", "Cedric", "Conor", "Dennis", "Edgar", "Emil", "Felix", "Frank",
        "Gilbert", "Gustav", "Harold", "Hugo", "Ivan", "Jakob", "Josef", "Karl", "Leo", "Ludwig", "Magnus", "Martin",
        "Nils", "Oskar", "Owen", "Pavel", "Ralph", "Stefan", "Tomas", "Victor", "Walter", "Xaver",
    ];

    public static (string Family, string Given) Draw(Chance chance, Sex sex) =>
        (chance.Pick(Family), chance.Pick(sex == Sex.Female ? Female : Male));
}
