using System.Globalization;
using System.Text;
using CsCheck;
using HfClinic.Records.Exchange;

namespace HfClinic.Records.Tests.Exchange;

/// <summary>Files that are not what they should be get a clear answer before anything is read in.</summary>
public class OddFilesTests
{
    [Theory]
    [InlineData("", "empty")]
    [InlineData("\r\n\r\n", "no heading")]
    [InlineData("clinic number;measured at;weight\r\n", "no lines")]
    [InlineData("clinic number;measured at;weight\r\n;;\r\n   \r\n", "no lines")]
    public async Task Nothing_to_read(string content, string expected)
    {
        using var file = ImportBench.Write(content);
        var refusal = await Assert.ThrowsAsync<RefusedException>(() => ImportBench.LookAsync(file.Path));
        Assert.Contains(expected, refusal.Problems.Single().What);
        Assert.NotEmpty(refusal.Problems.Single().Mend);
    }

    [Theory]
    [InlineData("504B0304140006000800", "spreadsheet")]
    [InlineData("255044462D312E37", "PDF")]
    [InlineData("89504E470D0A1A0A", "picture")]
    [InlineData("1F8B0800", "packed")]
    [InlineData("4D5A900003000000040000FFFF", "not text")]
    public async Task No_text(string bytes, string expected)
    {
        using var file = new ImportBench.TemporaryFile([.. Convert.FromHexString(bytes), .. Enumerable.Repeat((byte)7, 300)]);
        var refusal = await Assert.ThrowsAsync<RefusedException>(() => ImportBench.LookAsync(file.Path));
        Assert.Contains(expected, refusal.Problems.Single().What);
    }

    [Fact]
    public async Task One_endless_line_is_refused_with_its_number()
    {
        using var file = ImportBench.Write("clinic number;measured at;weight\nT-1;2026-03-30 07:00;80\n" + new string('x', 3_000_000));
        var refusal = await Assert.ThrowsAsync<RefusedException>(() => ImportBench.LookAsync(file.Path));
        Assert.Contains("ine 3 is too long", refusal.Problems.Single().What);
    }

    [Fact]
    public async Task Too_large_a_file_is_told_the_limit()
    {
        using var file = ImportBench.Write("clinic number;weight\nT-1;80\n");
        var refusal = await Assert.ThrowsAsync<RefusedException>(() =>
            FileLook.TakeAsync(file.Path, "x.csv", new ImportLimits(LargestFile: 10), TestContext.Current.CancellationToken));
        Assert.Contains("up to 1 MB", refusal.Problems.Single().What);
    }

    [Theory]
    [InlineData(';', "utf-8")]
    [InlineData(',', "utf-16")]
    [InlineData('\t', "utf-16BE")]
    [InlineData(';', "utf-32")]
    public async Task Separator_and_encoding_are_found(char separator, string encoding)
    {
        using var file = ImportBench.Write(
            $"clinic number{separator}family name{separator}given name\r\nT-1{separator}Øster{separator}Šárka\r\n", Encoding.GetEncoding(encoding));
        var look = await ImportBench.LookAsync(file.Path);
        Assert.Equal(separator, look.Separator);
        Assert.Null(look.EncodingNotice);
        Assert.Equal(["T-1", "Øster", "Šárka"], look.Sample.Single());
        Assert.Equal(ImportKind.Roster, FileMapping.Guess(look).Kind);
    }

    [Fact]
    public async Task An_old_western_file_is_read_with_a_notice()
    {
        using var file = new ImportBench.TemporaryFile(Encoding.Latin1.GetBytes("clinic number;family name;given name\r\nT-1;Ågård;Renée\r\n"));
        var look = await ImportBench.LookAsync(file.Path);
        Assert.Contains("Windows-1252", look.EncodingNotice);
        Assert.Equal(["T-1", "Ågård", "Renée"], look.Sample.Single());
    }

    [Fact]
    public async Task Wide_text_without_its_mark_is_read_with_a_notice()
    {
        using var file = new ImportBench.TemporaryFile(new UnicodeEncoding(false, false).GetBytes("clinic number;weight;date\r\nT-1;80,2;2026-03-30 07:00\r\n"));
        var look = await ImportBench.LookAsync(file.Path);
        Assert.Contains("UTF-16", look.EncodingNotice);
        Assert.Equal(3, look.Columns.Count);
    }

    [Fact]
    public async Task Quoted_fields_blank_lines_and_the_line_count_hold()
    {
        using var file = ImportBench.Write("\"clinic number\",weight,note\n\n\"T-1\",\"80,2\",\"he said \"\"fine\"\"\"\n\n\n\"T-2,81\n\"T-3\",82,x\n");
        var look = await ImportBench.LookAsync(file.Path);
        Assert.Equal(',', look.Separator);
        Assert.Equal(3, look.Lines);
        Assert.Equal(["T-1", "80,2", "he said \"fine\""], look.Sample[0]);
        Assert.Equal("T-3", look.Sample[2][0]);
    }

    [Fact]
    public void Any_bytes_are_either_read_or_refused_in_words() =>
        Gen.Byte.Array[0, 400].Sample(bytes =>
        {
            using var file = new ImportBench.TemporaryFile(bytes);
            try
            {
                var look = ImportBench.LookAsync(file.Path).GetAwaiter().GetResult();
                return look.Lines > 0 && look.Columns.Count > 0;
            }
            catch (RefusedException refusal)
            {
                return refusal.Problems.All(problem => problem.What.Length > 0);
            }
        }, iter: 300);

    [Fact]
    public void Any_text_is_a_date_or_not_but_never_a_fault() =>
        Gen.Select(Gen.String[Gen.Char["0123456789/-.: TZapmJanfeb+"], 0, 24], Gen.Int[0, 2]).Sample((text, order) =>
        {
            var read = DateText.Read(text, order == 0 ? null : (DateOrder)order);
            return read.Outcome != DateOutcome.Read || read.Day.Year > 0;
        }, iter: 20_000);

    [Fact]
    public void Numbers_written_either_way_are_the_same() =>
        Gen.Decimal[0, 99_999].Select(number => Math.Round(number, 3)).Sample(number =>
        {
            var text = number.ToString(CultureInfo.InvariantCulture);
            return NumberText.Read(text) == number && NumberText.Read(text.Replace('.', ',')) == number;
        }, iter: 2_000);
}
