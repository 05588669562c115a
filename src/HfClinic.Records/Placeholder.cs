namespace HfClinic.Records;
